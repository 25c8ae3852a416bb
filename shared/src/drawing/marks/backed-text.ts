import { polygon } from '../shape-makers.js'
import type { Shape, TextShape, Tone } from '../shapes.js'
import { textCorners } from '../text-box.js'

/** Text with clear ground behind it, so that no line or hatch runs through the letters. */
export function backedText(text: TextShape, ground: Tone): Shape[] {
  const middle = textCorners(text).reduce((sum, p) => ({ x: sum.x + p.x / 4, y: sum.y + p.y / 4 }), {
    x: 0,
    y: 0,
  })
  const grown = textCorners(text).map((p) => ({
    x: p.x + Math.sign(p.x - middle.x) * 0.6,
    y: p.y + Math.sign(p.y - middle.y) * 0.2,
  }))
  return [polygon(grown, { fill: ground }), text]
}
