import { isInsideRing, legsCross, legsOfLine, legsOfRing, type PlanLeg } from '../survey/plan-leg.js'
import type { PlanPoint } from '../survey/signed-area.js'

/** Whether a polyline has a point inside a closed outline or crosses it. A run that ends at the outline stays out. */
export function entersOutline({
  points,
  outline,
}: {
  points: readonly PlanPoint[]
  outline: readonly PlanPoint[]
}): boolean {
  const edges = legsOfRing(outline)
  if (points.some((point) => isInsideRing(point, edges) && !isOnEdge(point, edges))) return true
  return legsOfLine(points).some((leg) => edges.some((edge) => legsCross(leg, edge)))
}

const ON_EDGE_FT = 1e-6

const isOnEdge = (point: PlanPoint, edges: readonly PlanLeg[]): boolean =>
  edges.some(({ from, to }) => apartFt(from, point) + apartFt(point, to) - apartFt(from, to) < ON_EDGE_FT)

const apartFt = (a: PlanPoint, b: PlanPoint): number =>
  Math.sqrt((a.eastFt - b.eastFt) ** 2 + (a.northFt - b.northFt) ** 2)
