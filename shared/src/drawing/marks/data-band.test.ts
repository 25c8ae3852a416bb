import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { spread } from './data-band.js'

const box = { left: 0, right: 200 }

describe('spread', () => {
  it('leaves columns that have room where their stations are', () => {
    expect(spread([20, 60, 120], 18, box)).toEqual([20, 60, 120])
  })

  it('pushes crowded columns apart, in order and inside the band', () => {
    const places = fc.array(fc.double({ min: 0, max: 200, noNaN: true }), { minLength: 1, maxLength: 9 })
    fc.assert(
      fc.property(places, (wanted) => {
        const laid = spread(
          [...wanted].sort((a, b) => a - b),
          18,
          box,
        )
        laid.slice(1).forEach((x, index) => expect(x - (laid[index] ?? 0)).toBeGreaterThanOrEqual(18 - 1e-9))
        expect(Math.max(...laid)).toBeLessThanOrEqual(191 + 1e-9)
      }),
    )
  })
})
