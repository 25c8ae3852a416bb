import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatStation } from './format-station.js'
import { parseStation } from './parse-station.js'

describe('stations', () => {
  it.each([
    ['0+42', 42],
    ['1+15.5', 115.5],
    [' 42 ', 42],
    ['42.25', 42.25],
    ['-0+10', -10],
    ['12 + 05', 1205],
    ['-0', 0],
  ])('reads %s as %d ft', (text, feet) => {
    expect(parseStation(text)).toBe(feet)
  })

  it.each(['', 'abc', '1+', '+', '1+150', '1+2+3', '1e3', '0+4x', '1,5'])('does not read "%s"', (text) => {
    expect(parseStation(text)).toBeUndefined()
  })

  it('gives up on a cell of half a million spaces without trying each of them', () => {
    const from = performance.now()
    expect(parseStation(`1${' '.repeat(500_000)}2`)).toBeUndefined()
    expect(performance.now() - from).toBeLessThan(1000)
  })

  it.each([
    [0, 0, '0+00'],
    [5, 0, '0+05'],
    [115.5, 1, '1+15.5'],
    [43.6, 2, '0+43.60'],
    [-10, 0, '-0+10'],
    [99.99, 1, '1+00.0'],
    [-0.001, 1, '0+00.0'],
  ])('writes %d ft with %d decimals as %s', (stationFt, decimals, text) => {
    expect(formatStation({ stationFt, decimals })).toBe(text)
  })

  it('reads back what it wrote', () => {
    fc.assert(
      fc.property(fc.integer({ min: -500000, max: 500000 }), (hundredths) => {
        const stationFt = hundredths / 100
        expect(parseStation(formatStation({ stationFt, decimals: 2 }))).toBeCloseTo(stationFt, 9)
      }),
    )
  })
})
