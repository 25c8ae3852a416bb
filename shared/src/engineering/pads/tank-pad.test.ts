import { describe, expect, it } from 'vitest'
import { tankPad, type TankPadInput } from './tank-pad.js'

describe('tankPad', () => {
  it('takes the ring around a round tank', () => {
    const { areaFt2, tankAreaFt2 } = tankPad({ shape: 'round', diameterFt: 8, reachFt: 10 })
    expect(areaFt2).toBeCloseTo(Math.PI * 180, 10)
    expect(areaFt2 + tankAreaFt2).toBeCloseTo(Math.PI * 14 ** 2, 10)
  })

  it('takes the frame around a rectangular tank, with square corners', () => {
    expect(tankPad({ shape: 'rectangle', lengthFt: 10, widthFt: 4, reachFt: 10 }).areaFt2).toBe(30 * 24 - 40)
  })

  it('weighs the rock when asked', () => {
    const rock = { thicknessIn: 12, unitWeightTonsPerYd3: 1.5, wastePercent: 10 }
    const pad = tankPad({ shape: 'rectangle', lengthFt: 10, widthFt: 4, reachFt: 10, rock })
    expect(pad.rock?.volumeFt3).toBeCloseTo(680, 10)
    expect(pad.rock?.orderTons).toBeCloseTo((680 / 27) * 1.5 * 1.1, 10)
  })

  it.each<[TankPadInput, string]>([
    [{ shape: 'round', diameterFt: 0, reachFt: 10 }, 'diameterFt'],
    [{ shape: 'round', diameterFt: 8, reachFt: NaN }, 'reachFt'],
    [{ shape: 'rectangle', lengthFt: -1, widthFt: 4, reachFt: 1 }, 'lengthFt'],
    [{ shape: 'rectangle', lengthFt: 1, widthFt: 0, reachFt: 1 }, 'widthFt'],
    [{ shape: 'oval', reachFt: 1 } as never, 'shape'],
    [
      {
        shape: 'round',
        diameterFt: 8,
        reachFt: 1,
        rock: { thicknessIn: 0, unitWeightTonsPerYd3: 1, wastePercent: 0 },
      },
      'rock.thicknessIn',
    ],
  ])('refuses %o', (input, field) => {
    expect(() => tankPad(input)).toThrow(expect.objectContaining({ field }))
  })
})
