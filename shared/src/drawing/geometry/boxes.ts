import type { Box, Point } from '../shapes.js'

export function boundsOf(points: readonly Point[]): Box {
  const xs = points.map((point) => point.x)
  const ys = points.map((point) => point.y)
  return { left: Math.min(...xs), top: Math.min(...ys), right: Math.max(...xs), bottom: Math.max(...ys) }
}

export const boxesOverlap = (a: Box, b: Box) =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom

export const holdsPoint = (box: Box, point: Point, slackMm = 1e-6) =>
  point.x >= box.left - slackMm &&
  point.x <= box.right + slackMm &&
  point.y >= box.top - slackMm &&
  point.y <= box.bottom + slackMm

export const insetBox = (box: Box, byMm: number): Box => ({
  left: box.left + byMm,
  top: box.top + byMm,
  right: box.right - byMm,
  bottom: box.bottom - byMm,
})

export const ringOf = (box: Box): Point[] => [
  { x: box.left, y: box.top },
  { x: box.right, y: box.top },
  { x: box.right, y: box.bottom },
  { x: box.left, y: box.bottom },
]
