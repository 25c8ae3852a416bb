import type { SheetModel } from '../sheet-model.js'
import type { Point } from '../shapes.js'

export interface EastNorth {
  eastFt: number
  northFt: number
}

/** The ramp's center line on the map: a point of known station, and the unit vector toward the water. */
export interface PlanAxis {
  at: Point
  stationFt: number
  toWater: Point
  /** Whether the fence said where the ramp lies, or nothing did. */
  isKnown: boolean
}

export const asPoint = ({ eastFt, northFt }: EastNorth): Point => ({ x: eastFt, y: northFt })

const middle = (a: Point, b: Point): Point => ({ x: (a.x + b.x) / 2, y: (a.y + b.y) / 2 })

/**
 * The closing panel is drawn around the ramp, so its corners say where the center line runs; else the two lane
 * fences do. Without either the ramp is drawn running south from the origin, and the sheet says so.
 */
export function planAxis(model: SheetModel): PlanAxis {
  return (
    fromPanel(model) ??
    fromLanes(model) ?? {
      at: { x: 0, y: 0 },
      stationFt: model.profile.fullPoolEdgeStationFt,
      toWater: { x: 0, y: -1 },
      isKnown: false,
    }
  )
}

const pointsOf = (model: SheetModel, role: string): Point[][] =>
  (model.fence?.plan.runs ?? []).flatMap(({ path, role: own }) =>
    own === role && 'points' in path ? [path.points.map(asPoint)] : [],
  )

function fromPanel(model: SheetModel): PlanAxis | undefined {
  const [a, b, c, d] = pointsOf(model, 'closing')[0] ?? []
  if (!a || !b || !c || !d || !model.closing) return undefined
  const far = middle(b, c)
  return axisThrough(middle(a, d), far, { at: far, stationFt: model.closing.stationFt })
}

function fromLanes(model: SheetModel): PlanAxis | undefined {
  const [left, right] = pointsOf(model, 'lane')
  const starts = [left?.[0], right?.[0]]
  const ends = [left?.at(-1), right?.at(-1)]
  if (!starts[0] || !starts[1] || !ends[0] || !ends[1]) return undefined
  const water = middle(ends[0], ends[1])
  return axisThrough(middle(starts[0], starts[1]), water, {
    at: water,
    stationFt: model.profile.fullPoolEdgeStationFt,
  })
}

function axisThrough(from: Point, to: Point, known: { at: Point; stationFt: number }): PlanAxis | undefined {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  if (length < 1e-6) return undefined
  return { ...known, toWater: { x: (to.x - from.x) / length, y: (to.y - from.y) / length }, isKnown: true }
}

/** A place on the map by station and by distance left (positive) of the center line, looking at the water. */
export function onAxis(axis: PlanAxis, stationFt: number, leftFt = 0): Point {
  const along = stationFt - axis.stationFt
  return {
    x: axis.at.x + axis.toWater.x * along - axis.toWater.y * leftFt,
    y: axis.at.y + axis.toWater.y * along + axis.toWater.x * leftFt,
  }
}
