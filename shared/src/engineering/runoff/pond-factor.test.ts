import { describe, expect, it } from 'vitest'
import { pondFactor } from './pond-factor.js'

describe('pondFactor', () => {
  it.each([
    [0, 1],
    [0.2, 0.97],
    [1, 0.87],
    [3, 0.75],
    [5, 0.72],
    [40, 0.72],
  ])('is %d %% of ponds → %d (USDA NRCS TR-55, 1986, ch. 4)', (percent, factor) => {
    expect(pondFactor(percent)).toBeCloseTo(factor, 12)
  })

  it('is straight between two rows', () => {
    expect(pondFactor(2)).toBeCloseTo(0.81, 12)
  })

  it('refuses a share outside 0 to 100 percent', () => {
    expect(() => pondFactor(-1)).toThrow(expect.objectContaining({ field: 'pondPercent' }))
    expect(() => pondFactor(NaN)).toThrow(expect.objectContaining({ field: 'pondPercent' }))
  })
})
