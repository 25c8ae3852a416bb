import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { makeView, toGround, toPaper } from './view.js'

const clip = { left: 20, top: 30, right: 220, bottom: 120 }
const request = (widthFt: number, heightFt: number, mostExaggeration = 1) => ({
  key: 'k',
  title: 't',
  clip,
  mostExaggeration,
  window: { from: { x: 0, y: 90 }, to: { x: widthFt, y: 90 + heightFt } },
})

describe('makeView', () => {
  it('takes 1 in = 15 ft for 118 ft on 200 mm, since 10 ft would not fit', () => {
    expect(makeView(request(118, 10)).scaleNote).toBe('1 in = 15 ft, true shape')
  })

  it('exaggerates height as far as asked and as the paper allows', () => {
    expect(makeView(request(118, 10, 3)).exaggeration).toBe(3)
    expect(makeView(request(118, 30, 3)).exaggeration).toBe(1.5)
  })

  it('keeps the whole window on the paper, and comes back from paper to ground', () => {
    const feet = fc.double({ min: 0.5, max: 900, noNaN: true })
    fc.assert(
      fc.property(feet, feet, (widthFt, heightFt) => {
        const view = makeView(request(widthFt, heightFt, 3))
        const corner = { x: widthFt, y: 90 + heightFt }
        const paper = toPaper(view, corner)
        expect(paper.x).toBeLessThanOrEqual(clip.right + 1e-6)
        expect(paper.y).toBeGreaterThanOrEqual(clip.top - 1e-6)
        expect(toGround(view, paper).x).toBeCloseTo(corner.x, 6)
        expect(toGround(view, paper).y).toBeCloseTo(corner.y, 6)
      }),
    )
  })
})
