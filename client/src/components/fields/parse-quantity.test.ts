import { describe, expect, it } from 'vitest'
import { parseQuantity } from './parse-quantity'

describe('parseQuantity', () => {
  it.each([
    ['12', 12],
    [' 12.50 ', 12.5],
    ['.5', 0.5],
    ['1,250', 1250],
    ['1 250.5', 1250.5],
    ['12.5 ft', 12.5],
    ['30 °F', 30],
    ['12\'6"', 12.5],
    ['12 ft 6 in', 12.5],
    ['-1.25', -1.25],
    ['−1.25', -1.25],
    ['6:1', 6],
    ['6 : 1', 6],
    ['10%', 10],
  ])('reads %s as %d', (typed, meant) => {
    expect(parseQuantity(typed)).toBe(meant)
  })

  it.each(['', 'about 5', '12,5', '1,25', '1e3', '5-6', '--2', '6:2', 'NaN', 'Infinity'])(
    'does not guess what %s means',
    (typed) => {
      expect(parseQuantity(typed)).toBeUndefined()
    },
  )
})
