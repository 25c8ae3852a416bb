import type { Box, Point } from '../shapes.js'

/** The parts of a polyline inside a box, each cut exactly on the edge. */
export function clipPolyline(line: readonly Point[], box: Box): Point[][] {
  const parts: Point[][] = []
  line.slice(1).forEach((end, index) => {
    const start = line[index]
    const piece = start && clipSegment(start, end, box)
    if (!piece) return
    const open = parts.at(-1)
    const last = open?.at(-1)
    if (open && last && samePoint(last, piece[0]) && samePoint(piece[0], start)) open.push(piece[1])
    else parts.push([...piece])
  })
  return parts
}

const samePoint = (a: Point, b: Point) => Math.abs(a.x - b.x) < 1e-9 && Math.abs(a.y - b.y) < 1e-9

/** Liang and Barsky's parametric cut of one segment. */
function clipSegment(a: Point, b: Point, box: Box): [Point, Point] | null {
  const dx = b.x - a.x
  const dy = b.y - a.y
  const edges = [
    [-dx, a.x - box.left],
    [dx, box.right - a.x],
    [-dy, a.y - box.top],
    [dy, box.bottom - a.y],
  ] as const
  let from = 0
  let to = 1
  for (const [along, room] of edges) {
    if (along === 0 && room < 0) return null
    if (along < 0) from = Math.max(from, room / along)
    if (along > 0) to = Math.min(to, room / along)
  }
  if (from > to) return null
  const at = (t: number): Point => ({ x: a.x + t * dx, y: a.y + t * dy })
  return [at(from), at(to)]
}
