import { describe, expect, it } from 'vitest'
import { perUnit } from './per-unit'

describe('perUnit', () => {
  it('says a price as one would say it', () => {
    expect(['each', 'ton', 'acre'].map(perUnit)).toEqual(['each', 'a ton', 'an acre'])
  })
})
