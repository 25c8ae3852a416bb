import { isInsideRing, legsCross, legsOfLine, legsOfRing, squareToLegFt2 } from '../survey/plan-leg.js'
import type { PlanLeg } from '../survey/plan-leg.js'
import type { PlanPoint } from '../survey/signed-area.js'

interface SetbackInput {
  /** Fence lines, each of at least two points. */
  lines: readonly (readonly PlanPoint[])[]
  /** Edge of the water, at least three points; the ring closes itself. */
  outline: readonly PlanPoint[]
}

/**
 * Least distance between fence and water's edge. Two legs that do not cross are nearest at an end of one of them, so
 * every point is held against every leg, both ways. A fence that touches, crosses or stands in the water has none.
 *
 * @returns ft, 0 or more.
 * Source: plane geometry.
 * @example setbackFt({ lines: [[{ eastFt: 0, northFt: 12 }, { eastFt: 9, northFt: 12 }]], outline }) // 12
 */
export function setbackFt({ lines, outline }: SetbackInput): number {
  const shore = legsOfRing(outline)
  const fence = lines.flatMap(legsOfLine)
  const isWet = fence.some(
    (leg) => isInsideRing(leg.from, shore) || shore.some((edge) => legsCross(leg, edge)),
  )
  if (isWet) return 0
  return Math.sqrt(Math.min(leastSquareFt2(lines.flat(), shore), leastSquareFt2(outline, fence)))
}

function leastSquareFt2(points: readonly PlanPoint[], legs: readonly PlanLeg[]): number {
  let least = Infinity
  for (const point of points) {
    for (const leg of legs) {
      const square = squareToLegFt2(point, leg)
      if (square < least) least = square
    }
  }
  return least
}
