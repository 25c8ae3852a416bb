import type { PlanPoint } from './signed-area.js'

/** One straight piece of a line on the map. */
export interface PlanLeg {
  from: PlanPoint
  to: PlanPoint
}

export const legsOfLine = (points: readonly PlanPoint[]): PlanLeg[] =>
  points.slice(1).map((to, index) => ({ from: points[index] ?? to, to }))

/** The ring closes itself. */
export const legsOfRing = (ring: readonly PlanPoint[]): PlanLeg[] =>
  ring.map((from, index) => ({ from, to: ring[(index + 1) % ring.length] ?? from }))

/** Positive where the point lies left of the leg, 0 on its line. */
const sideOf = ({ from, to }: PlanLeg, point: PlanPoint): number =>
  (to.eastFt - from.eastFt) * (point.northFt - from.northFt) -
  (to.northFt - from.northFt) * (point.eastFt - from.eastFt)

/** Whether two legs cross; legs that only touch do not. */
export const legsCross = (a: PlanLeg, b: PlanLeg): boolean =>
  sideOf(a, b.from) * sideOf(a, b.to) < 0 && sideOf(b, a.from) * sideOf(b, a.to) < 0

/** Even-odd rule: a ray to the east meets the ring an odd number of times from inside. */
export function isInsideRing({ eastFt, northFt }: PlanPoint, ring: readonly PlanLeg[]): boolean {
  let isInside = false
  for (const { from, to } of ring) {
    if (from.northFt > northFt === to.northFt > northFt) continue
    const share = (northFt - from.northFt) / (to.northFt - from.northFt)
    if (from.eastFt + share * (to.eastFt - from.eastFt) > eastFt) isInside = !isInside
  }
  return isInside
}

/** Square of the least distance between a point and a leg, ft². A square, since millions of them are compared. */
export function squareToLegFt2(point: PlanPoint, { from, to }: PlanLeg): number {
  const east = to.eastFt - from.eastFt
  const north = to.northFt - from.northFt
  const square = east * east + north * north
  const along =
    square === 0 ? 0 : ((point.eastFt - from.eastFt) * east + (point.northFt - from.northFt) * north) / square
  const held = along < 0 ? 0 : along > 1 ? 1 : along
  const offEast = point.eastFt - from.eastFt - held * east
  const offNorth = point.northFt - from.northFt - held * north
  return offEast * offEast + offNorth * offNorth
}
