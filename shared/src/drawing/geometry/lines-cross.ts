import type { Point } from '../shapes.js'

/** Whether two polylines cross; touching at an end is no crossing. */
export function linesCross(one: readonly Point[], other: readonly Point[]): boolean {
  return segments(one).some(([a, b]) => segments(other).some(([c, d]) => segmentsCross(a, b, c, d)))
}

const segments = (line: readonly Point[]): [Point, Point][] =>
  line.slice(1).flatMap((end, index): [Point, Point][] => {
    const start = line[index]
    return start ? [[start, end]] : []
  })

const turn = (a: Point, b: Point, c: Point) => (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x)

const segmentsCross = (a: Point, b: Point, c: Point, d: Point) =>
  turn(a, b, c) * turn(a, b, d) < 0 && turn(c, d, a) * turn(c, d, b) < 0
