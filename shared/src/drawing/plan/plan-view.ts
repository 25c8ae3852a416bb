import { boundsOf } from '../geometry/boxes.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Point, View } from '../shapes.js'
import { makeView } from '../view.js'
import { asPoint, onAxis, type PlanAxis } from './plan-axis.js'
import { bermFootprint } from './plan-works.js'

const spanOf = (points: Point[], roomFt: number) => {
  const box = boundsOf(points)
  return {
    from: { x: box.left - roomFt, y: box.top - roomFt },
    to: { x: box.right + roomFt, y: box.bottom + roomFt },
  }
}

/** The ramp with pad and berm, large. */
export function worksView(model: SheetModel, axis: PlanAxis, clip: Box): View {
  const foot = bermFootprint(model)
  const half = model.ramp.widthFt / 2
  const from = Math.min(
    foot?.from ?? Infinity,
    model.pad?.fromStationFt ?? Infinity,
    model.profile.topStationFt,
  )
  const to = (model.closing?.stationFt ?? model.profile.toeStationFt) + 2
  const corners = [
    onAxis(axis, from - 5, foot?.left ?? half),
    onAxis(axis, from - 5, -(foot?.right ?? half)),
    onAxis(axis, to, half + 2),
    onAxis(axis, to, -half - 2),
  ]
  return makeView({ key: 'plan', title: 'Plan of the access', clip, window: spanOf(corners, 3) })
}

/** The whole enclosure, when the fence or the water is on the map; else there is nothing more to show. */
export function wholeView(model: SheetModel, clip: Box): View | null {
  const runs = model.fence?.plan.runs ?? []
  const fence = runs.flatMap(({ path }) => ('points' in path ? path.points.map(asPoint) : []))
  const water = model.site.waterOutline?.map(asPoint) ?? []
  const points = [...fence, ...water]
  if (points.length < 3) return null
  return makeView({ key: 'enclosure', title: 'The whole enclosure', clip, window: spanOf(points, 8) })
}
