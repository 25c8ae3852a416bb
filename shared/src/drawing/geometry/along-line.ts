import type { Point } from '../shapes.js'

export interface Stop {
  at: Point
  /** Unit vector along the line. */
  along: Point
}

/** Stops along a polyline every so many millimetres, the first half a step in. */
export function stopsAlong(line: readonly Point[], stepMm: number): Stop[] {
  const stops: Stop[] = []
  let next = stepMm / 2
  let walked = 0
  line.slice(1).forEach((end, index) => {
    const start = line[index] ?? end
    const length = Math.hypot(end.x - start.x, end.y - start.y)
    if (length === 0) return
    const along = { x: (end.x - start.x) / length, y: (end.y - start.y) / length }
    while (next <= walked + length) {
      const t = next - walked
      stops.push({ at: { x: start.x + along.x * t, y: start.y + along.y * t }, along })
      next += stepMm
    }
    walked += length
  })
  return stops
}
