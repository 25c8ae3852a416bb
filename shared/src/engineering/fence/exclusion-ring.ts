import type { PlanPoint } from '../survey/signed-area.js'

/**
 * Ring of the exclusion fence: its lines one after the other, each time the one whose end is nearest, turned round
 * where needed. What is left open, such as the mouth of the lane, closes straight across.
 *
 * @param lines fence lines, each of at least two points.
 * @returns points of the ring; the last one joins the first.
 * Common practice, no source.
 */
export function exclusionRing(lines: readonly (readonly PlanPoint[])[]): PlanPoint[] {
  const [first = [], ...rest] = lines
  const left = rest.map((line) => [...line])
  const ring = [...first]
  while (left.length > 0) {
    const tail = ring[ring.length - 1]
    if (!tail) return ring
    const options = left.flatMap((line) => [
      { line, points: line },
      { line, points: line.toReversed() },
    ])
    const nearest = options.reduce((best, option) =>
      gap(tail, option.points) < gap(tail, best.points) ? option : best,
    )
    ring.push(...nearest.points)
    left.splice(left.indexOf(nearest.line), 1)
  }
  return ring
}

function gap(tail: PlanPoint, [head]: readonly PlanPoint[]): number {
  return head ? Math.hypot(head.eastFt - tail.eastFt, head.northFt - tail.northFt) : Infinity
}
