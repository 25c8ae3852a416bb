import { describe, expect, it } from 'vitest'
import { workedPlan } from '../../../test/worked-example.js'
import { pondStorage } from './pond-storage.js'

const basin = [0, 490, 1740, 4290, 6880, 10320, 12830, 15500, 19870].map((areaFt2, index) => ({
  elevationFt: 278 + index,
  areaFt2,
}))

describe('pondStorage', () => {
  it('gives the cumulative volumes of FHWA HEC-22, 4th ed., example 10.6, table 10.4', () => {
    const printed = [0, 245, 1360, 4375, 9960, 18560, 30135, 44300, 61985]
    expect(pondStorage({ stages: basin }).averageEndAreaFt3).toEqual(printed)
  })

  it('gives the frustum rule of HEC-22, eq. 10.19, on the same basin, recomputed apart from this code', () => {
    expect(pondStorage({ stages: basin }).prismoidalFt3.at(-1)).toBeCloseTo(61547.6, 1)
  })

  it('gives the volumes that were worked out apart from this code for one constructed pond', () => {
    const { averageEndAreaFt3, prismoidalFt3 } = pondStorage({ stages: workedPlan.pond?.stages ?? [] })
    expect(averageEndAreaFt3).toEqual([0, 48900, 102100, 159800, 222200])
    const apart = [0, 48884.96238865783, 102069.79299331008, 159754.50673384286, 222139.1164246694]
    prismoidalFt3.forEach((volume, index) => expect(volume).toBeCloseTo(apart[index] ?? NaN, 6))
  })

  it('agrees with the volume of a cone that stands on its point', () => {
    const stages = [0, 10].map((elevationFt) => ({ elevationFt, areaFt2: Math.PI * elevationFt ** 2 }))
    expect(pondStorage({ stages }).prismoidalFt3.at(-1)).toBeCloseTo((Math.PI * 10 ** 3) / 3, 8)
  })

  it.each([
    [[], 'stages', /two levels or more/],
    [[{ elevationFt: 96, areaFt2: 1 }], 'stages', /two levels or more/],
    [
      [
        { elevationFt: 96, areaFt2: 1 },
        { elevationFt: 96, areaFt2: 2 },
      ],
      'stages[1].elevationFt',
      /The level 96 ft is not above the level before it, 96 ft/,
    ],
    [
      [
        { elevationFt: 96, areaFt2: -1 },
        { elevationFt: 97, areaFt2: 2 },
      ],
      'stages[0].areaFt2',
      /at least 0/,
    ],
    [
      [
        { elevationFt: 96, areaFt2: 1 },
        { elevationFt: NaN, areaFt2: 2 },
      ],
      'stages[1].elevationFt',
      /not a number/,
    ],
  ])('refuses the stages %j', (stages, field, message) => {
    expect(() => pondStorage({ stages })).toThrow(
      expect.objectContaining({ field, message: expect.stringMatching(message) }),
    )
  })
})
