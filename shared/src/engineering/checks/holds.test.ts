import { describe, expect, it } from 'vitest'
import { holds } from './holds.js'

describe('holds', () => {
  it.each([
    ['at-least', 6, 6, true],
    ['at-least', 5.99, 6, false],
    ['at-least', 6 - 1e-12, 6, true],
    ['at-most', 0.5, 0.5, true],
    ['at-most', 0.51, 0.5, false],
    ['at-most', 0.1 + 0.2, 0.3, true],
  ] as const)('%s: %d against %d is %s', (comparison, actual, limit, expected) => {
    expect(holds({ comparison, actual, limit })).toBe(expected)
  })

  it.each([
    [8, true],
    [20, true],
    [7.9, false],
    [20.1, false],
  ])('between 8 and 20: %d is %s', (actual, expected) => {
    expect(holds({ comparison: 'between', actual, limit: [8, 20] })).toBe(expected)
  })

  it('takes only a plain yes for a yes', () => {
    expect(holds({ comparison: 'yes', actual: true, limit: undefined })).toBe(true)
    expect(holds({ comparison: 'yes', actual: false, limit: undefined })).toBe(false)
    expect(holds({ comparison: 'yes', actual: 1, limit: undefined })).toBe(false)
  })

  it('does not hold against a limit that is not there', () => {
    expect(holds({ comparison: 'at-least', actual: 1e9, limit: undefined })).toBe(false)
  })
})
