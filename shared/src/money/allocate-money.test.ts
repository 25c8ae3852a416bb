import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Money } from '../schemas/primitives.js'
import { allocateMoney } from './allocate-money.js'
import { Exact } from './exact.js'
import { addMoney } from './money-arithmetic.js'

const split = (total: string, weights: number[]) =>
  allocateMoney(
    total as Money,
    weights.map((weight) => new Exact(weight)),
  )

describe('allocateMoney', () => {
  it('gives the cents left over to the largest remainders', () => {
    expect(split('1.00', [1, 2, 3])).toEqual(['0.17', '0.33', '0.50'])
  })

  it('gives the earlier part the cent where remainders are equal', () => {
    expect(split('0.01', [1, 1])).toEqual(['0.01', '0.00'])
  })

  it('gives nothing to a part without weight', () => {
    expect(split('0.05', [0, 3, 0])).toEqual(['0.00', '0.05', '0.00'])
  })

  it('refuses to split an amount by nothing', () => {
    expect(() => split('0.01', [0, 0])).toThrow(RangeError)
    expect(split('0.00', [0, 0])).toEqual(['0.00', '0.00'])
  })

  it('keeps the sum, and every part within a cent of its share', () => {
    const weights = fc.array(fc.double({ min: 0.001, max: 1e6, noNaN: true }), {
      minLength: 1,
      maxLength: 12,
    })
    fc.assert(
      fc.property(fc.nat(10_000_000), weights, (cents, parts) => {
        const total = (cents / 100).toFixed(2)
        const amounts = split(total, parts)
        expect(addMoney(...amounts)).toBe(total)
        const sum = parts.reduce((a, b) => a + b, 0)
        amounts.forEach((amount, index) => {
          const share = (cents * (parts[index] ?? 0)) / sum
          expect(Math.abs(Number(amount) * 100 - share)).toBeLessThan(1.001)
        })
      }),
    )
  })
})
