import { describe, expect, it } from 'vitest'
import { higherRate } from './higher-rate.js'

describe('higherRate', () => {
  it('turns 36.12 at 75 % into 43.34 at 90 % (NRCS Missouri payment schedule, brush management, 2013)', () => {
    expect(higherRate({ baseRate: '36.12', basePercent: 75, higherPercent: 90 })).toBe('43.34')
  })

  it('keeps the rate where both percents are the same', () => {
    expect(higherRate({ baseRate: '29.82', basePercent: 75, higherPercent: 75 })).toBe('29.82')
  })

  it('refuses a base percent of 0', () => {
    expect(() => higherRate({ baseRate: '1.00', basePercent: 0, higherPercent: 90 })).toThrow('basePercent')
  })
})
