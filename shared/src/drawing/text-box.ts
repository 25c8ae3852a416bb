import { boundsOf } from './geometry/boxes.js'
import type { Box, Point, TextShape } from './shapes.js'
import { textWidthMm } from './text-width.js'

const shareBefore = { left: 0, center: 0.5, right: 1 } as const
const RISE = 0.72
const FALL = 0.22

/** The four corners that a line of text covers on paper. */
export function textCorners(text: TextShape): Point[] {
  const width = textWidthMm(text)
  const left = -shareBefore[text.align] * width
  const corners = [
    { x: left, y: -RISE * text.sizeMm },
    { x: left + width, y: -RISE * text.sizeMm },
    { x: left + width, y: FALL * text.sizeMm },
    { x: left, y: FALL * text.sizeMm },
  ]
  const turn = ((text.angleDeg ?? 0) * Math.PI) / 180
  return corners.map(({ x, y }) => ({
    x: text.at.x + x * Math.cos(turn) + y * Math.sin(turn),
    y: text.at.y - x * Math.sin(turn) + y * Math.cos(turn),
  }))
}

export const textBox = (text: TextShape): Box => boundsOf(textCorners(text))
