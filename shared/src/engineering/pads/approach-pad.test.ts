import { describe, expect, it } from 'vitest'
import { approachPad, type ApproachPadInput } from './approach-pad.js'

const pad: ApproachPadInput = {
  lengthFt: 10,
  widthFt: 18,
  thicknessIn: 8,
  unitWeightTonsPerYd3: 1.35,
  wastePercent: 5,
  rampTopStationFt: 43.6,
  rampVerticalRockThicknessFt: 1.0077822185373186,
}

describe('approachPad', () => {
  it('runs landward from the ramp top, without thickening (constructed example, no outside evidence)', () => {
    const fabric = { sideTurnUpFt: 1, lapDryFt: 2, rollWidthFt: 15, rollLengthFt: 300 }
    const built = approachPad({ ...pad, thickenAtRampFt: 0, fabric })
    expect(built.fromStationFt).toBeCloseTo(33.6, 10)
    expect(built.toStationFt).toBe(43.6)
    expect(built.volumeYd3).toBeCloseTo(4.444444444444445, 12)
    expect(built.tons).toBeCloseTo(6, 10)
    expect(built.orderTons).toBeCloseTo(6.3, 10)
    expect(built.cutYd3).toBeCloseTo(4.444444444444445, 12)
    expect(built.stepToRampFormationFt).toBeCloseTo(0.341115551870652, 12)
    expect(built.fabric?.netAreaFt2).toBeCloseTo(240, 10)
  })

  it('thickens over 3 ft down to the ramp rock: half the step · 3 ft · width', () => {
    const built = approachPad(pad)
    expect(built.thickeningFt3).toBeCloseTo((0.341115551870652 / 2) * 3 * 18, 9)
    expect(built.volumeFt3).toBeCloseTo(120 + built.thickeningFt3, 9)
    expect(built.cutYd3).toBeCloseTo(built.volumeYd3, 12)
  })

  it('does not thin a pad that is thicker than the ramp, and keeps a short pad within its length', () => {
    expect(approachPad({ ...pad, thicknessIn: 18 })).toMatchObject({ thickeningFt3: 0 })
    expect(approachPad({ ...pad, thicknessIn: 18 }).stepToRampFormationFt).toBeLessThan(0)
    const short = approachPad({ ...pad, lengthFt: 2 })
    expect(short.thickeningFt3).toBeCloseTo((0.341115551870652 / 2) * 2 * 18, 9)
  })

  it('leaves fabric and loads out when they are not asked for', () => {
    expect(approachPad(pad)).not.toHaveProperty('fabric')
    expect(approachPad(pad)).not.toHaveProperty('loads')
    expect(approachPad({ ...pad, truckTons: 18 }).loads).toBe(1)
  })

  it.each<[Partial<ApproachPadInput>, string]>([
    [{ lengthFt: 0 }, 'lengthFt'],
    [{ widthFt: NaN }, 'widthFt'],
    [{ thicknessIn: 0 }, 'thicknessIn'],
    [{ unitWeightTonsPerYd3: 5 }, 'unitWeightTonsPerYd3'],
    [{ wastePercent: -1 }, 'wastePercent'],
    [{ truckTons: 0 }, 'truckTons'],
    [{ rampTopStationFt: NaN }, 'rampTopStationFt'],
    [{ rampVerticalRockThicknessFt: -1 }, 'rampVerticalRockThicknessFt'],
    [{ thickenAtRampFt: 11 }, 'thickenAtRampFt'],
    [{ fabric: { sideTurnUpFt: 1, lapDryFt: 15, rollWidthFt: 15, rollLengthFt: 300 } }, 'lapDryFt'],
  ])('refuses %o', (change, field) => {
    expect(() => approachPad({ ...pad, ...change })).toThrow(expect.objectContaining({ field }))
  })
})
