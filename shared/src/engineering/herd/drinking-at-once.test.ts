import { describe, expect, it } from 'vitest'
import { drinkingAtOnce } from './drinking-at-once.js'
import { drinkingFrontage } from './drinking-frontage.js'

describe('drinkingAtOnce', () => {
  it.each([
    [75, 0.1, 8],
    [70, 0.1, 7],
    [100, 0.03, 3],
    [1, 0.01, 1],
  ])('of %d head with a share of %d counts %d whole animals', (headCount, shareAtOnce, head) => {
    expect(drinkingAtOnce({ headCount, shareAtOnce })).toBe(head)
  })

  it.each([0, -0.1, 1.01, NaN])('refuses a share of %d', (shareAtOnce) => {
    expect(() => drinkingAtOnce({ headCount: 10, shareAtOnce })).toThrow(
      expect.objectContaining({ field: 'shareAtOnce' }),
    )
  })
})

describe('drinkingFrontage', () => {
  it('asks for 2 ft of edge for every drinking head (Ohio State University Extension, ANR-12)', () => {
    expect(drinkingFrontage({ headCount: 75, shareAtOnce: 0.1, widthFt: 18 })).toEqual({
      drinkingAtOnce: 8,
      neededFt: 16,
      haveFt: 18,
      isEnough: true,
    })
  })

  it('is enough at exactly the needed width and not a foot below', () => {
    const at = (widthFt: number) => drinkingFrontage({ headCount: 75, shareAtOnce: 0.1, widthFt }).isEnough
    expect([at(16), at(15.9)]).toEqual([true, false])
  })

  it.each([
    [{ widthFt: 0 }, 'widthFt'],
    [{ widthFt: 18, ftPerHead: 0 }, 'ftPerHead'],
    [{ widthFt: 18, headCount: 0 }, 'headCount'],
  ])('refuses %o', (change, field) => {
    const input = { headCount: 10, shareAtOnce: 0.1, ...change }
    expect(() => drinkingFrontage(input)).toThrow(expect.objectContaining({ field }))
  })
})
