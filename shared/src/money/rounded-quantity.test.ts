import { describe, expect, it } from 'vitest'
import { roundedQuantity } from './rounded-quantity.js'

describe('roundedQuantity', () => {
  it.each([
    [34.07699739843486, 'ton', 34.077],
    [1184.9640687119286, 'ft', 1184.9641],
    [0.0818747716001146, 'acre', 0.08187],
    [0.00005, 'ton', 0.0001],
    [1, 'each', 1],
    [7.00000000001, 'unknown unit', 7],
  ])('shows %d %s as %d', (quantity, unit, shown) => {
    expect(roundedQuantity(quantity, unit)).toBe(shown)
  })

  it('does not change a quantity that is rounded already', () => {
    const once = roundedQuantity(Math.PI, 'ton')
    expect(roundedQuantity(once, 'ton')).toBe(once)
  })
})
