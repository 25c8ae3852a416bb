import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { timeOfConcentrationHr } from './time-of-concentration-hr.js'
import { timeOfConcentration } from './time-of-concentration.js'
import type { TravelSegment } from './travel-segment.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const sheet: TravelSegment = {
  kind: 'sheet',
  lengthFt: 223,
  slopeFtPerFt: 0.01,
  roughness: 0.41,
  twoYearRainfallIn: 4.35,
}

describe('timeOfConcentration by lag', () => {
  it('gives lag 1.033 h and Tc 1.722 h for 6,900 ft, CN 75, 2.8 % (published textbook problem)', () => {
    const { lagHr, timeOfConcentrationHr: Tc } = timeOfConcentration({
      method: 'lag',
      flowLengthFt: 6900,
      curveNumber: 75,
      landSlopePercent: 2.8,
    })
    expect(Math.abs((lagHr ?? 0) - 1.033)).toBeLessThan(0.0015)
    expect(Math.abs(Tc - 1.722)).toBeLessThan(0.002)
  })

  it('gives 0.0732 h and 0.1220 h (constructed example, no outside evidence)', () => {
    const result = timeOfConcentration({
      method: 'lag',
      flowLengthFt: 420,
      curveNumber: 79,
      landSlopePercent: 5,
    })
    expect(result.lagHr).toBeCloseTo(0.07322347831760183, 14)
    expect(result.timeOfConcentrationHr).toBeCloseTo(0.12203913052933639, 14)
  })
})

describe('timeOfConcentration by Kirpich', () => {
  it('gives 7.18 min for 1,000 ft at 0.02 (published check value)', () => {
    const Tc = timeOfConcentrationHr({ method: 'kirpich', flowLengthFt: 1000, slopeFtPerFt: 0.02 })
    expect(Tc * 60).toBeCloseTo(7.18, 2)
  })

  it('gives 9.38 min for 2,000 ft at 0.04, not the misprinted 13.7 (published calculator example)', () => {
    const minutes = 60 * timeOfConcentrationHr({ method: 'kirpich', flowLengthFt: 2000, slopeFtPerFt: 0.04 })
    expect(minutes).toBeCloseTo(9.38, 2)
  })

  it('gives 146.4 min for 27,926 ft falling 173 ft, not the misprinted 14.64 (published drainage study)', () => {
    const slopeFtPerFt = 173 / 27926
    const minutes = 60 * timeOfConcentrationHr({ method: 'kirpich', flowLengthFt: 27926, slopeFtPerFt })
    expect(minutes).toBeCloseTo(146.4, 1)
  })

  it('multiplies by the factor for the surface', () => {
    const plain = timeOfConcentrationHr({ method: 'kirpich', flowLengthFt: 300, slopeFtPerFt: 0.05 })
    const grass = timeOfConcentrationHr({
      method: 'kirpich',
      flowLengthFt: 300,
      slopeFtPerFt: 0.05,
      factor: 2,
    })
    expect(grass).toBeCloseTo(2 * plain, 12)
  })
})

describe('timeOfConcentration by segments', () => {
  it('gives 47.1 min of sheet flow (FHWA HEC-22, 4th ed., 2024, example 4.2)', () => {
    const { segmentsHr } = timeOfConcentration({
      method: 'segments',
      segments: [sheet],
      sheetLengthLimitFt: 300,
    })
    expect(Math.abs((segmentsHr?.[0] ?? 0) * 60 - 47.1)).toBeLessThan(0.05)
  })

  it('gives 3.7 min for 259 ft at 1.16 ft/s (FHWA HEC-22, 4th ed., 2024, example 4.2)', () => {
    const segments: TravelSegment[] = [{ kind: 'channel', lengthFt: 259, velocityFtPerS: 1.16 }]
    expect(timeOfConcentrationHr({ method: 'segments', segments }) * 60).toBeCloseTo(3.7, 1)
  })

  it('gives 0.30 + 0.24 + 0.99 = 1.53 h (USDA NRCS TR-55, 1986, example 3-1, from memory, verify)', () => {
    const { segmentsHr, timeOfConcentrationHr: Tc } = timeOfConcentration({
      method: 'segments',
      segments: [
        { kind: 'sheet', lengthFt: 100, slopeFtPerFt: 0.01, roughness: 0.24, twoYearRainfallIn: 3.6 },
        { kind: 'shallow', lengthFt: 1400, slopeFtPerFt: 0.01, surface: 'unpaved' },
        {
          kind: 'channel',
          lengthFt: 7300,
          slopeFtPerFt: 0.005,
          roughness: 0.05,
          hydraulicRadiusFt: 27 / 28.2,
        },
      ],
    })
    const printed = [0.3, 0.24, 0.99]
    printed.forEach((hours, index) => {
      expect(Math.abs((segmentsHr?.[index] ?? 0) - hours)).toBeLessThan(0.0055)
    })
    expect(Math.abs(Tc - 1.53)).toBeLessThan(0.005)
  })

  it('lets water run faster over pavement', () => {
    const over = (surface: 'paved' | 'unpaved') =>
      timeOfConcentrationHr({
        method: 'segments',
        segments: [{ kind: 'shallow', lengthFt: 500, slopeFtPerFt: 0.02, surface }],
      })
    expect(over('unpaved') / over('paved')).toBeCloseTo(20.3282 / 16.1345, 10)
  })

  it('adds up its parts, in any order', () => {
    const length = fc.double({ min: 1, max: 5000, noNaN: true })
    fc.assert(
      fc.property(length, length, (a, b) => {
        const segments: TravelSegment[] = [
          { kind: 'channel', lengthFt: a, velocityFtPerS: 2 },
          { kind: 'channel', lengthFt: b, velocityFtPerS: 3 },
        ]
        const there = timeOfConcentrationHr({ method: 'segments', segments })
        const back = timeOfConcentrationHr({ method: 'segments', segments: segments.toReversed() })
        expect(there).toBeCloseTo(a / 7200 + b / 10800, 10)
        expect(back).toBeCloseTo(there, 12)
      }),
    )
  })

  it('holds sheet flow to 100 ft unless the district sets another length', () => {
    expect(() => timeOfConcentrationHr({ method: 'segments', segments: [sheet] })).toThrow(
      refusal('segments[0].lengthFt'),
    )
  })

  it('refuses an empty path and names the stretch that is wrong', () => {
    expect(() => timeOfConcentrationHr({ method: 'segments', segments: [] })).toThrow(refusal('segments'))
    const segments: TravelSegment[] = [
      { kind: 'channel', lengthFt: 10, velocityFtPerS: 1 },
      { kind: 'channel', lengthFt: 10, velocityFtPerS: 0 },
    ]
    expect(() => timeOfConcentrationHr({ method: 'segments', segments })).toThrow(
      refusal('segments[1].velocityFtPerS'),
    )
  })
})

describe('timeOfConcentration with bad input', () => {
  it.each([
    ['flowLengthFt', { method: 'lag', flowLengthFt: 0, curveNumber: 75, landSlopePercent: 2 }],
    ['curveNumber', { method: 'lag', flowLengthFt: 500, curveNumber: NaN, landSlopePercent: 2 }],
    ['landSlopePercent', { method: 'lag', flowLengthFt: 500, curveNumber: 75, landSlopePercent: -0 }],
    ['slopeFtPerFt', { method: 'kirpich', flowLengthFt: 500, slopeFtPerFt: 0 }],
    ['factor', { method: 'kirpich', flowLengthFt: 500, slopeFtPerFt: 0.1, factor: 0 }],
  ] as const)('refuses a bad %s by name', (field, input) => {
    expect(() => timeOfConcentrationHr(input)).toThrow(refusal(field))
  })
})
