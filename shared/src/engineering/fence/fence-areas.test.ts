import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fenceTakeOff } from './fence-take-off.js'
import { at, pondJob, straightRun, withRuns } from './fence-take-off.fixture.js'
import type { FenceRun } from './fence-input.js'
import { setbackFt } from './setback-ft.js'

const pond = [at(0, 0), at(100, 0), at(100, 100), at(0, 100)]
const exclusion = (...points: ReturnType<typeof at>[]): FenceRun => ({
  ...straightRun,
  role: 'exclusion',
  path: { points },
})

describe('setbackFt', () => {
  it('is the distance square to a shore, not only between corners', () => {
    expect(setbackFt({ lines: [[at(-50, -12), at(500, -12)]], outline: pond })).toBe(12)
  })

  it('is found from a corner of the water to the middle of a leg as well', () => {
    const lines = [[at(-60, 60), at(60, -60)]]
    expect(
      setbackFt({ lines, outline: pond.map(({ eastFt, northFt }) => at(eastFt + 30, northFt + 30)) }),
    ).toBeCloseTo(Math.hypot(30, 30), 9)
  })

  it('is 0 for a fence that crosses the shore or stands in the water', () => {
    expect(setbackFt({ lines: [[at(-50, 50), at(150, 50)]], outline: pond })).toBe(0)
    expect(setbackFt({ lines: [[at(40, 40), at(60, 60)]], outline: pond })).toBe(0)
  })

  it('does not change when everything is moved', () => {
    const move = fc.double({ min: -1e5, max: 1e5, noNaN: true })
    fc.assert(
      fc.property(move, move, (east, north) => {
        const moved = (points: typeof pond) =>
          points.map(({ eastFt, northFt }) => at(eastFt + east, northFt + north))
        const lines = [[at(-30, -20), at(130, -25)]]
        const here = setbackFt({ lines, outline: pond })
        expect(setbackFt({ lines: lines.map(moved), outline: moved(pond) })).toBeCloseTo(here, 6)
      }),
    )
  })
})

describe('fenceTakeOff areas', () => {
  it('closes exclusion runs across the lane mouth whatever their order and direction', () => {
    const west = exclusion(at(40, 0), at(0, 0), at(0, 100), at(50, 100))
    const east = exclusion(at(60, 0), at(100, 0), at(100, 100), at(50, 100))
    for (const runs of [
      [west, east],
      [east, west],
    ]) {
      expect(fenceTakeOff(withRuns(runs)).enclosedAreaFt2).toBeCloseTo(10000, 9)
    }
  })

  it('leaves setback and areas out, not 0, where the fence is only measured', () => {
    const measured = fenceTakeOff(withRuns([{ ...straightRun, role: 'exclusion' }]))
    for (const key of ['setbackFt', 'enclosedAreaFt2', 'waterAreaFt2', 'habitatAreaFt2']) {
      expect(measured).not.toHaveProperty(key)
    }
  })

  it('knows the enclosed area without the water, but no setback', () => {
    const dry = { ...pondJob, waterOutline: undefined }
    const result = fenceTakeOff(dry)
    expect(result.enclosedAreaFt2).toBe(96750)
    expect(result).not.toHaveProperty('setbackFt')
    expect(result).not.toHaveProperty('habitatAreaFt2')
  })

  it('does not hold lane and closing runs against the setback', () => {
    const onlyLane = { ...pondJob, runs: pondJob.runs.slice(1) }
    expect(fenceTakeOff(onlyLane)).not.toHaveProperty('setbackFt')
  })

  it('gives no area to a fence that crosses itself, and says so', () => {
    const crossed = exclusion(at(0, 0), at(100, 100), at(100, 0), at(0, 100))
    const result = fenceTakeOff(withRuns([crossed]))
    expect(result).not.toHaveProperty('enclosedAreaFt2')
    expect(result.notes.join()).toContain('crosses itself')
  })

  it('sets nothing aside where the fence does not hold the water, and says so', () => {
    const small = exclusion(at(0, 300), at(10, 300), at(10, 310), at(0, 310))
    const result = fenceTakeOff({ ...withRuns([small]), waterOutline: pond })
    expect(result).not.toHaveProperty('habitatAreaFt2')
    expect(result.notes.join()).toContain('encloses less')
  })
})
