import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { PlanPoint } from '../survey/signed-area.js'
import { deflectionDeg } from './deflection-deg.js'
import type { FencePath } from './fence-input.js'

export interface RunEnd {
  label?: string
  /** Where the end stands and the direction from it into the run, radians; absent for a run that is not drawn. */
  point?: PlanPoint
  headingRad?: number
}

export interface RunPath {
  lengthFt: number
  /** Without repeated points; empty for a run that is not drawn. */
  points: PlanPoint[]
  corners: { atFt: number; deflectionDeg: number }[]
  start: RunEnd
  end: RunEnd
}

interface RunPathInput {
  path: FencePath
  cornerAngleDeg: number
  /** Where the path stands in the input, such as runs[0].path. */
  at: string
}

const heading = (from: PlanPoint, to: PlanPoint) =>
  Math.atan2(to.northFt - from.northFt, to.eastFt - from.eastFt)

const distance = (from: PlanPoint, to: PlanPoint) =>
  Math.hypot(to.eastFt - from.eastFt, to.northFt - from.northFt)

/**
 * Length of a run, and its corners: the points at which it turns by more than the corner angle.
 *
 * @throws EngineeringInputError naming path.lengthFt, path.points or a coordinate of a point.
 * Source: plane geometry.
 * @example runPath({ path: { lengthFt: 200 }, cornerAngleDeg: 20, at: 'runs[0].path' }).lengthFt // 200
 */
export function runPath({ path, cornerAngleDeg, at }: RunPathInput): RunPath {
  const start = path.startsAt === undefined ? {} : { label: path.startsAt }
  const end = path.endsAt === undefined ? {} : { label: path.endsAt }
  if (!('points' in path)) {
    const lengthFt = requireNumber({ field: `${at}.lengthFt`, value: path.lengthFt, exclusiveMin: 0 })
    return { lengthFt, points: [], corners: [], start, end }
  }
  const points = distinctPoints(path.points, at)
  const legs = points.slice(1).map((to, index) => {
    const from = points[index] ?? to
    return { from, lengthFt: distance(from, to), headingRad: heading(from, to) }
  })
  const [first, last] = [legs[0], legs[legs.length - 1]]
  const startPoint = points[0]
  const endPoint = points[points.length - 1]
  if (!first || !last || !startPoint || !endPoint) return refusePoints(at)
  return {
    lengthFt: legs.reduce((sum, leg) => sum + leg.lengthFt, 0),
    points,
    corners: cornersOf(legs, cornerAngleDeg),
    start: { ...start, point: startPoint, headingRad: first.headingRad },
    end: { ...end, point: endPoint, headingRad: last.headingRad + Math.PI },
  }
}

function cornersOf(legs: readonly { lengthFt: number; headingRad: number }[], cornerAngleDeg: number) {
  let atFt = 0
  return legs.flatMap((leg, index) => {
    const next = legs[index + 1]
    atFt += leg.lengthFt
    if (!next) return []
    const turn = deflectionDeg(leg.headingRad, next.headingRad)
    return turn > cornerAngleDeg ? [{ atFt, deflectionDeg: turn }] : []
  })
}

/** A double click on a map leaves the same point twice; a leg without length has no direction. */
function distinctPoints(points: readonly PlanPoint[], at: string): PlanPoint[] {
  const checked = points.map(({ eastFt, northFt }, index) => ({
    eastFt: requireNumber({ field: `${at}.points[${index}].eastFt`, value: eastFt }),
    northFt: requireNumber({ field: `${at}.points[${index}].northFt`, value: northFt }),
  }))
  return checked.filter((point, index) => {
    const before = checked[index - 1]
    return !before || distance(before, point) > 1e-6
  })
}

function refusePoints(at: string): never {
  throw new EngineeringInputError({
    field: `${at}.points`,
    message: `${at}.points has fewer than two points that differ; a run needs a start and an end.`,
  })
}
