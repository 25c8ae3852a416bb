import { describe, expect, it } from 'vitest'
import { formatFeet } from './format-feet.js'
import { formatInstant } from './format-instant.js'
import { formatPercent } from './format-percent.js'
import { formatQuantity } from './format-quantity.js'
import { formatRatio } from './format-ratio.js'

describe('figures for people', () => {
  it('keeps number and unit together with a space that does not break', () => {
    expect(formatFeet(17.5)).toBe('17.5\u00a0ft')
    expect(formatRatio(6)).toBe('6\u00a0:\u00a01')
    expect(formatPercent(12.5)).toBe('12.5\u00a0%')
  })

  it('writes whole figures without decimals and thousands with commas', () => {
    expect(formatRatio(2.5)).toBe('2.5\u00a0:\u00a01')
    expect(formatPercent(100)).toBe('100\u00a0%')
    expect(formatFeet(1124.264, 0)).toBe('1,124\u00a0ft')
    expect(formatQuantity(20, 'ft')).toBe('20\u00a0ft')
  })

  it.each([
    [34.077, 'ton', '34.077\u00a0tons'],
    [1, 'ton', '1\u00a0ton'],
    [1184.9641, 'ft', '1,184.9641\u00a0ft'],
    [7.6566, 'yd3', '7.6566\u00a0yd³'],
    [0.08187, 'acre', '0.08187\u00a0acres'],
    [2, 'each', '2'],
  ])('shows the payable quantity %d %s as it is multiplied', (quantity, unit, text) => {
    expect(formatQuantity(quantity, unit)).toBe(text)
  })

  it.each([
    ['2026-05-14T20:04:00Z', 'America/Chicago', '14 May 2026, 15:04 CDT'],
    ['2026-01-01T03:30:00Z', 'America/Chicago', '31 December 2025, 21:30 CST'],
    ['2026-05-14T20:04:00Z', 'UTC', '14 May 2026, 20:04 UTC'],
    ['2026-05-14T05:00:00Z', 'America/Chicago', '14 May 2026, 00:00 CDT'],
  ])('gives the instant %s in %s', (instant, zone, text) => {
    expect(formatInstant(instant, zone)).toBe(text)
  })
})
