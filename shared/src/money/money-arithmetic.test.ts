import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Money } from '../schemas/primitives.js'
import {
  addMoney,
  compareMoney,
  leastMoney,
  money,
  percentOfMoney,
  priceOf,
  subtractMoney,
} from './money-arithmetic.js'

const m = (text: string) => text as Money

describe('money', () => {
  it('adds what binary floats cannot: 0.10 + 0.20 = 0.30', () => {
    expect(addMoney(m('0.10'), m('0.20'))).toBe('0.30')
  })

  it('adds nothing to 0.00', () => {
    expect(addMoney()).toBe('0.00')
  })

  it.each([
    [0.5, '0.01', '0.01'],
    [0.49, '0.01', '0.00'],
    [1.005, '1.00', '1.01'],
    [2.675, '1.00', '2.68'],
    [1000000, '1234.5678', '1234567800.00'],
  ])('rounds %d at %s a unit half up to %s', (quantity, rate, amount) => {
    expect(priceOf(quantity, rate)).toBe(amount)
  })

  // Kerr Center, Stabilized Stream Crossings (2011 prices): fabric 104 yd2 at 1.20.
  it('prices the fabric line of the Kerr Center stream crossing (2011) at 124.80', () => {
    expect(priceOf(104, '1.20')).toBe('124.80')
  })

  // UF/IFAS AN258, 2011, rev. 2014: tools for a barbed wire job.
  it('sums the tools of UF/IFAS AN258 (rev. 2014) to 181.93', () => {
    const tools = ['21.99', '29.99', '18.99', '19.99', '31.99', '24.99', '3.99', '30.00']
    expect(addMoney(...tools.map(m))).toBe('181.93')
  })

  it('refuses to take more than there is', () => {
    expect(() => subtractMoney(m('1.00'), m('1.01'))).toThrow(RangeError)
    expect(subtractMoney(m('1.00'), m('1.00'))).toBe('0.00')
  })

  it('compares as numbers, not as text', () => {
    expect(compareMoney(m('9.00'), m('10.00'))).toBeLessThan(0)
    expect(leastMoney(m('10.00'), m('9.00'), m('11.00'))).toBe('9.00')
  })

  it('reads dollars written as text only', () => {
    expect(money('72.5')).toBe('72.50')
    for (const bad of ['', '-1', '1e3', '1,000.00', ' 1', 'NaN']) expect(() => money(bad)).toThrow('amount')
  })

  it('takes a percent and rounds half a cent upward', () => {
    expect(percentOfMoney(m('3949.97'), 50)).toBe('1974.99')
  })

  it('gives back what was added, for any two amounts', () => {
    const amount = fc.bigInt(0n, 10n ** 13n).map((v) => m(`${v / 100n}.${String(v % 100n).padStart(2, '0')}`))
    fc.assert(
      fc.property(amount, amount, (a, b) => {
        expect(subtractMoney(addMoney(a, b), b)).toBe(a)
      }),
    )
  })
})
