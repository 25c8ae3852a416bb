import { describe, expect, it } from 'vitest'
import { rationalPeakCfs } from './rational-peak-cfs.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

describe('rationalPeakCfs', () => {
  it.each([
    [0.235, 1.9, 19.3],
    [0.315, 2.3, 31.4],
  ])(
    'C %d at %d in/h on 43.3 acres gives %d cfs (FHWA HEC-22, 4th ed., 2024, example 4.3)',
    (C, i, printed) => {
      const peak = rationalPeakCfs({ runoffCoefficient: C, intensityInPerHr: i, areaAcres: 43.3 })
      expect(Math.abs(peak - printed)).toBeLessThan(0.05)
    },
  )

  it('uses the factor 1: 0.4 · 2.87 · 128 = 146.944 cfs (published textbook problem)', () => {
    const peak = rationalPeakCfs({ runoffCoefficient: 0.4, intensityInPerHr: 2.87, areaAcres: 128 })
    expect(peak).toBeCloseTo(146.944, 9)
  })

  it.each([
    ['runoffCoefficient', { runoffCoefficient: 0, intensityInPerHr: 2, areaAcres: 3 }],
    ['runoffCoefficient', { runoffCoefficient: 1.01, intensityInPerHr: 2, areaAcres: 3 }],
    ['intensityInPerHr', { runoffCoefficient: 0.4, intensityInPerHr: NaN, areaAcres: 3 }],
    ['areaAcres', { runoffCoefficient: 0.4, intensityInPerHr: 2, areaAcres: 0 }],
    ['areaAcres', { runoffCoefficient: 0.4, intensityInPerHr: 2, areaAcres: 200 }],
  ])('refuses a bad %s by name', (field, input) => {
    expect(() => rationalPeakCfs(input)).toThrow(refusal(field))
  })
})
