import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { groundElevationFt } from './ground-elevation-ft.js'

const groundLine = [
  { stationFt: 0, elevationFt: 103.2 },
  { stationFt: 42, elevationFt: 101.7 },
  { stationFt: 46, elevationFt: 101.2 },
  { stationFt: 85, elevationFt: 95.8 },
  { stationFt: 100, elevationFt: 94.6 },
]

describe('groundElevationFt', () => {
  it.each([
    [0, 103.2],
    [43.6, 101.5],
    [99.6, 94.632],
    [100, 94.6],
  ])(
    'runs straight between shots, at station %d (constructed example, no outside evidence)',
    (stationFt, elevation) => {
      expect(groundElevationFt({ groundLine, stationFt })).toBeCloseTo(elevation, 10)
    },
  )

  it('gives every shot its own elevation back, and stays between neighbours', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: 0, max: 5000 }), { minLength: 2, maxLength: 30 }),
        fc.integer({ min: 0, max: 100 }),
        (stations, percent) => {
          const line = stations
            .sort((a, b) => a - b)
            .map((stationFt, index) => ({ stationFt, elevationFt: ((index * 37) % 11) + index / 7 }))
          for (const point of line) {
            expect(groundElevationFt({ groundLine: line, stationFt: point.stationFt })).toBe(
              point.elevationFt,
            )
          }
          const [left, right] = line
          if (!left || !right) throw new Error('two points were asked for')
          const stationFt = left.stationFt + ((right.stationFt - left.stationFt) * percent) / 100
          const elevation = groundElevationFt({ groundLine: line, stationFt })
          expect(elevation).toBeGreaterThanOrEqual(Math.min(left.elevationFt, right.elevationFt) - 1e-9)
          expect(elevation).toBeLessThanOrEqual(Math.max(left.elevationFt, right.elevationFt) + 1e-9)
        },
      ),
    )
  })

  it.each([-0.1, 100.1])('refuses station %d, which lies outside the survey', (stationFt) => {
    expect(() => groundElevationFt({ groundLine, stationFt })).toThrow(
      expect.objectContaining({ field: 'stationFt', message: expect.stringContaining('from 0 to 100') }),
    )
  })

  it.each([NaN, Infinity])('refuses station %d', (stationFt) => {
    expect(() => groundElevationFt({ groundLine, stationFt })).toThrow(
      expect.objectContaining({ field: 'stationFt' }),
    )
  })
})
