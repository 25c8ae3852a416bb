import { describe, expect, it } from 'vitest'
import { contrastRatio } from './contrast-ratio'
import { lightTokens } from './light-tokens'
import { colourPairs } from './theme-tokens'

describe('contrast ratio', () => {
  it('is 21 for black on white and 1 for a colour on itself (WCAG 2.2, definition of contrast ratio)', () => {
    expect(contrastRatio('#000000', '#FFFFFF')).toBeCloseTo(21, 10)
    expect(contrastRatio('#2B6F86', '#2B6F86')).toBe(1)
  })

  it('does not depend on which colour is named first', () => {
    expect(contrastRatio('#FFFFFF', '#777777')).toBe(contrastRatio('#777777', '#FFFFFF'))
  })
})

describe('light theme', () => {
  it.each(colourPairs)('$text on $on reaches $atLeast', ({ text, on, atLeast }) => {
    expect(contrastRatio(lightTokens[text], lightTokens[on])).toBeGreaterThanOrEqual(atLeast)
  })
})
