import type { PlanPoint } from '../survey/signed-area.js'

interface Leg {
  from: PlanPoint
  to: PlanPoint
}

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
  const shore = legsOf([...outline, ...outline.slice(0, 1)])
  const fence = lines.flatMap(legsOf)
  const isWet = fence.some((leg) => inside(leg.from, shore) || shore.some((edge) => crosses(leg, edge)))
  if (isWet) return 0
  const reach = (points: readonly PlanPoint[], legs: readonly Leg[]) =>
    points.reduce(
      (least, point) => legs.reduce((near, leg) => Math.min(near, toLeg(point, leg)), least),
      Infinity,
    )
  return Math.min(reach(lines.flat(), shore), reach(outline, fence))
}

const legsOf = (points: readonly PlanPoint[]): Leg[] =>
  points.slice(1).map((to, index) => ({ from: points[index] ?? to, to }))

function toLeg(point: PlanPoint, { from, to }: Leg): number {
  const east = to.eastFt - from.eastFt
  const north = to.northFt - from.northFt
  const square = east ** 2 + north ** 2
  const along =
    square === 0 ? 0 : ((point.eastFt - from.eastFt) * east + (point.northFt - from.northFt) * north) / square
  const held = Math.min(Math.max(along, 0), 1)
  return Math.hypot(point.eastFt - from.eastFt - held * east, point.northFt - from.northFt - held * north)
}

function crosses(a: Leg, b: Leg): boolean {
  return sideOf(a, b.from) * sideOf(a, b.to) < 0 && sideOf(b, a.from) * sideOf(b, a.to) < 0
}

const sideOf = ({ from, to }: Leg, point: PlanPoint): number =>
  Math.sign(
    (to.eastFt - from.eastFt) * (point.northFt - from.northFt) -
      (to.northFt - from.northFt) * (point.eastFt - from.eastFt),
  )

/** Even-odd rule: a ray to the east meets the shore an odd number of times from inside. */
function inside(point: PlanPoint, shore: readonly Leg[]): boolean {
  const met = shore.filter(({ from, to }) => {
    if (from.northFt > point.northFt === to.northFt > point.northFt) return false
    const share = (point.northFt - from.northFt) / (to.northFt - from.northFt)
    return from.eastFt + share * (to.eastFt - from.eastFt) > point.eastFt
  })
  return met.length % 2 === 1
}
