import { describe, expect, it } from 'vitest'
import { groundLine, profileInput } from '../../../examples/constructed-ramp.js'
import { closingPanel, type ClosingPanelInput } from './closing-panel.js'
import { rampProfile } from './ramp-profile.js'

const input: ClosingPanelInput = {
  profile: rampProfile(profileInput),
  widthFt: 18,
  clearFt: 1,
  beyondToeFt: 3,
  aboveWaterFt: 2,
  postSpacingFt: 12,
}

describe('closingPanel', () => {
  it('runs 47 ft out from the full-pool edge, 20 across and 47 back (constructed example, no outside evidence)', () => {
    const panel = closingPanel(input)
    expect(panel.pullsFt).toEqual({ side: expect.closeTo(47, 9), end: 20 })
    expect(panel.lengthFt).toBeCloseTo(114, 9)
    expect(panel.deepestWaterFt).toBeCloseTo(5.5, 9)
    expect(panel.heightAtDeepestPostFt).toBeCloseTo(7.5, 9)
  })

  it('counts posts pull by pull: ends, corners, and sections less one between', () => {
    expect(closingPanel(input)).toMatchObject({ linePosts: 7, cornerPosts: 2, endPosts: 2, posts: 11 })
    expect(closingPanel({ ...input, postSpacingFt: 10 }).linePosts).toBe(9)
    expect(closingPanel({ ...input, postSpacingFt: 60 }).linePosts).toBe(0)
  })

  it('floats where the water at full pool is deeper than 5 ft (Kerr Center, pond watering points)', () => {
    expect(closingPanel(input).support).toBe('float')
    expect(closingPanel({ ...input, floatBeyondDepthFt: 5.5 }).support).toBe('posts')
  })

  it('takes the bed beyond the toe from the survey when that is deeper', () => {
    const panel = closingPanel({ ...input, groundLine })
    expect(panel.deepestWaterFt).toBeCloseTo(100 - (94.6 - (2.6 * 0.9) / 15), 9)
  })

  it('says how far the survey must reach', () => {
    expect(() => closingPanel({ ...input, groundLine: groundLine.slice(0, 10) })).toThrow(
      expect.objectContaining({
        field: 'groundLine',
        message: expect.stringContaining('at least station 102.6'),
      }),
    )
  })

  it.each<[Partial<ClosingPanelInput>, string]>([
    [{ widthFt: 0 }, 'widthFt'],
    [{ clearFt: -1 }, 'clearFt'],
    [{ beyondToeFt: NaN }, 'beyondToeFt'],
    [{ aboveWaterFt: -1 }, 'aboveWaterFt'],
    [{ postSpacingFt: 0 }, 'postSpacingFt'],
    [{ floatBeyondDepthFt: 0 }, 'floatBeyondDepthFt'],
  ])('refuses %o', (change, field) => {
    expect(() => closingPanel({ ...input, ...change })).toThrow(expect.objectContaining({ field }))
  })
})
