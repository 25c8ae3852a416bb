import type { Box, Point } from '../shapes.js'

interface Side {
  inside: (point: Point) => boolean
  cross: (a: Point, b: Point) => Point
}

/** Sutherland and Hodgman: one side of the box after the other. */
export function clipPolygon(ring: readonly Point[], box: Box): Point[] {
  return sidesOf(box).reduce<Point[]>(cutBySide, [...ring])
}

function cutBySide(ring: Point[], side: Side): Point[] {
  return ring.flatMap((end, index) => {
    const start = ring[(index + ring.length - 1) % ring.length] ?? end
    const enters = side.inside(end)
    if (side.inside(start) === enters) return enters ? [end] : []
    const border = side.cross(start, end)
    return enters ? [border, end] : [border]
  })
}

function sidesOf(box: Box): Side[] {
  const atX = (x: number) => (a: Point, b: Point) => ({
    x,
    y: a.y + ((x - a.x) / (b.x - a.x)) * (b.y - a.y),
  })
  const atY = (y: number) => (a: Point, b: Point) => ({
    x: a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x),
    y,
  })
  return [
    { inside: (p) => p.x >= box.left, cross: atX(box.left) },
    { inside: (p) => p.x <= box.right, cross: atX(box.right) },
    { inside: (p) => p.y >= box.top, cross: atY(box.top) },
    { inside: (p) => p.y <= box.bottom, cross: atY(box.bottom) },
  ]
}
