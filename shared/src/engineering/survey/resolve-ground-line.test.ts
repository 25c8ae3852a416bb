import { describe, expect, it } from 'vitest'
import { EngineeringInputError } from '../engineering-input-error.js'
import { resolveGroundLine } from './resolve-ground-line.js'

const fails = (groundLine: unknown, waterSurfaceFt?: number) => {
  try {
    resolveGroundLine({ groundLine: groundLine as never, waterSurfaceFt })
  } catch (error) {
    if (error instanceof EngineeringInputError) return error
  }
  return undefined
}

describe('resolveGroundLine', () => {
  it('takes a sounding as water surface less depth', () => {
    const groundLine = [
      { stationFt: 0, elevationFt: 100 },
      { stationFt: 9, waterDepthFt: 2 },
    ]
    expect(resolveGroundLine({ groundLine, waterSurfaceFt: 98.5 })).toEqual([
      { stationFt: 0, elevationFt: 100 },
      { stationFt: 9, elevationFt: 96.5 },
    ])
  })

  it('refuses a sounding without a water surface', () => {
    const error = fails([
      { stationFt: 0, elevationFt: 100 },
      { stationFt: 9, waterDepthFt: 2 },
    ])
    expect(error?.field).toBe('waterSurfaceFt')
  })

  it.each([[undefined], [[]], [[{ stationFt: 0, elevationFt: 1 }]]])(
    'refuses fewer than two points',
    (line) => {
      expect(fails(line)?.field).toBe('groundLine')
      expect(fails(line)?.message).toContain('at least two')
    },
  )

  it.each([0, -1])(
    'refuses a station that does not lie farther, and says how a cut bank is entered',
    (step) => {
      const error = fails([
        { stationFt: 5, elevationFt: 10 },
        { stationFt: 5 + step, elevationFt: 8 },
      ])
      expect(error?.field).toBe('groundLine')
      expect(error?.message).toContain('foot at least 0.1 ft farther than its lip')
    },
  )

  it.each([
    [{ stationFt: NaN, elevationFt: 1 }, 'groundLine[1].stationFt'],
    [{ stationFt: 9, elevationFt: Infinity }, 'groundLine[1].elevationFt'],
    [{ stationFt: 9 }, 'groundLine[1].elevationFt'],
    [{ stationFt: 9, waterDepthFt: -1 }, 'groundLine[1].waterDepthFt'],
    [{ stationFt: 9, waterDepthFt: 1, elevationFt: 3 }, 'groundLine[1]'],
  ])('names the figure that is wrong in %o', (point, field) => {
    expect(fails([{ stationFt: 0, elevationFt: 1 }, point], 10)?.field).toBe(field)
  })
})
