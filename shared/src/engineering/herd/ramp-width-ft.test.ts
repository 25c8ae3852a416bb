import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { DEFAULT_RAMP_WIDTH_RULE, rampWidth } from './ramp-width.js'
import { rampWidthFt } from './ramp-width-ft.js'

const upToFoot = { ...DEFAULT_RAMP_WIDTH_RULE, rounding: 'up-to-foot' } as const

describe('rampWidthFt', () => {
  it('gives 50 head a ramp of 15 ft (K-State, Livestock Watering Handbook, Limited Access)', () => {
    expect(rampWidthFt({ headCount: 50 })).toBe(15)
  })

  it('gives 75 head 17.5 ft, or 18 ft in whole feet (constructed example, no outside evidence)', () => {
    expect(rampWidthFt({ headCount: 75 })).toBe(17.5)
    expect(rampWidthFt({ headCount: 75, rule: upToFoot })).toBe(18)
  })

  it('does not round a whole foot up to the next one', () => {
    for (let tens = 1; tens <= 70; tens += 1) {
      expect(rampWidthFt({ headCount: tens * 10, rule: upToFoot })).toBe(10 + tens)
    }
  })

  it('cuts the width to 80 ft and keeps what the rule asked for', () => {
    expect(rampWidth({ headCount: 900 })).toEqual({ widthFt: 80, ruleFt: 100, limitedBy: 'maximum' })
    const rule = { ...DEFAULT_RAMP_WIDTH_RULE, baseFt: 2 }
    expect(rampWidth({ headCount: 10, rule })).toEqual({ widthFt: 10, ruleFt: 3, limitedBy: 'minimum' })
  })

  it('never gives a larger herd a narrower ramp', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 2000 }), (headCount) => {
        const width = rampWidthFt({ headCount, rule: upToFoot })
        expect(rampWidthFt({ headCount: headCount + 1, rule: upToFoot })).toBeGreaterThanOrEqual(width)
      }),
    )
  })

  it.each([0, -1, 1.5, NaN, Infinity])('refuses a herd of %d', (headCount) => {
    expect(() => rampWidthFt({ headCount })).toThrow(expect.objectContaining({ field: 'headCount' }))
  })

  it.each([
    [{ baseFt: -1 }, 'rule.baseFt'],
    [{ perHeadFt: NaN }, 'rule.perHeadFt'],
    [{ minimumFt: 0 }, 'rule.minimumFt'],
    [{ maximumFt: 5 }, 'rule.maximumFt'],
    [{ rounding: 'down' as never }, 'rule.rounding'],
  ])('refuses the rule %o', (change, field) => {
    const rule = { ...DEFAULT_RAMP_WIDTH_RULE, ...change }
    expect(() => rampWidthFt({ headCount: 10, rule })).toThrow(expect.objectContaining({ field }))
  })
})
