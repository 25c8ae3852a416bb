import { describe, expect, it } from 'vitest'
import { wholePieces } from './whole-pieces.js'

describe('wholePieces', () => {
  it.each([
    [0, 25, 0],
    [1e-12, 25, 1],
    [25, 25, 1],
    [25.01, 25, 2],
    [100 + 1e-10, 25, 4],
  ])('covers %d by pieces of %d with %d', (length, piece, count) => {
    expect(wholePieces(length, piece)).toBe(count)
  })
})
