import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { runoffDepthIn } from './runoff-depth-in.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

describe('runoffDepthIn', () => {
  it('gives 3.28 in for 6.0 in on CN 75 (USDA NRCS TR-55, 1986, example 4-1)', () => {
    expect(runoffDepthIn({ rainfallIn: 6, curveNumber: 75 })).toBeCloseTo(3.28, 2)
  })

  it('gives 2.89 in for 5 in on CN 80 (USDA NRCS TR-55, 1986, table 2-1)', () => {
    expect(runoffDepthIn({ rainfallIn: 5, curveNumber: 80 })).toBeCloseTo(2.89, 2)
  })

  it.each([
    [4.81, 1.75],
    [7.08, 3.47],
    [8.29, 4.48],
  ])(
    'gives the printed depth for %d in on CN 68 (published drainage study, Maryland)',
    (rainfallIn, depth) => {
      expect(Math.abs(runoffDepthIn({ rainfallIn, curveNumber: 68 }) - depth)).toBeLessThan(0.006)
    },
  )

  it('gives 0.170 in for 1.8 in on CN 70, not the misprinted 0.11 (published permit calculation)', () => {
    const depth = runoffDepthIn({ rainfallIn: 1.8, curveNumber: 70 })
    expect(depth).toBeCloseTo(0.17, 3)
    expect(Math.abs(depth - 0.11)).toBeGreaterThan(0.05)
  })

  it('gives 2.63028 in (constructed example, no outside evidence)', () => {
    expect(runoffDepthIn({ rainfallIn: 4.8, curveNumber: 79 })).toBeCloseTo(2.630279813457695, 12)
  })

  it('gives nothing while the rain only fills the initial abstraction', () => {
    expect(runoffDepthIn({ rainfallIn: 0.3, curveNumber: 70 })).toBe(0)
    expect(runoffDepthIn({ rainfallIn: 0, curveNumber: 100 })).toBe(0)
  })

  it('lets all rain run off at CN 100', () => {
    expect(runoffDepthIn({ rainfallIn: 4, curveNumber: 100 })).toBe(4)
  })

  it('rises with rain and curve number and never exceeds the rain', () => {
    const rain = fc.double({ min: 0, max: 40, noNaN: true })
    const number = fc.double({ min: 30, max: 99, noNaN: true })
    fc.assert(
      fc.property(rain, number, (rainfallIn, curveNumber) => {
        const depth = runoffDepthIn({ rainfallIn, curveNumber })
        expect(depth).toBeLessThanOrEqual(rainfallIn)
        expect(runoffDepthIn({ rainfallIn: rainfallIn + 0.5, curveNumber })).toBeGreaterThanOrEqual(depth)
        expect(runoffDepthIn({ rainfallIn, curveNumber: curveNumber + 1 })).toBeGreaterThanOrEqual(depth)
      }),
    )
  })

  it.each([
    ['rainfallIn', { rainfallIn: NaN, curveNumber: 75 }],
    ['rainfallIn', { rainfallIn: -0.1, curveNumber: 75 }],
    ['rainfallIn', { rainfallIn: Infinity, curveNumber: 75 }],
    ['curveNumber', { rainfallIn: 4, curveNumber: 29.9 }],
    ['curveNumber', { rainfallIn: 4, curveNumber: 100.1 }],
    ['curveNumber', { rainfallIn: 4, curveNumber: NaN }],
  ])('refuses a bad %s by name', (field, input) => {
    expect(() => runoffDepthIn(input)).toThrow(refusal(field))
  })

  it('takes minus zero rain as none', () => {
    expect(Object.is(runoffDepthIn({ rainfallIn: -0, curveNumber: 75 }), 0)).toBe(true)
  })
})
