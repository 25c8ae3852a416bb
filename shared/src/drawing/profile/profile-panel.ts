import { levelAt } from '../level-at.js'
import { pens } from '../pens.js'
import { polyline } from '../shape-makers.js'
import type { Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { toPaper } from '../view.js'
import { solidLine } from './solid-line.js'

const POST_IN_GROUND_FT = 1.2

/** The closing panel seen from the side: its outermost post, and the rails that run back along the ramp. */
export function profilePanel(model: SheetModel, view: View): Shape[] {
  if (!model.closing) return []
  const { stationFt, plan } = model.closing
  const solid = solidLine(model).map((p) => ({ stationFt: p.x, elevationFt: p.y }))
  const top = model.site.fullPoolElevationFt + plan.aboveWaterFt
  const edge = model.profile.fullPoolEdgeStationFt
  const post = (x: number) => [
    toPaper(view, { x, y: levelAt(solid, x) - POST_IN_GROUND_FT }),
    toPaper(view, { x, y: top }),
  ]
  const posts = Math.max(1, Math.ceil((stationFt - edge) / plan.postSpacingFt - 1e-9))
  const stations = Array.from(
    { length: posts + 1 },
    (_, index) => edge + ((stationFt - edge) * index) / posts,
  )
  const rails = [0.92, 0.5, 0.08].map((share) => {
    const y = model.site.fullPoolElevationFt + plan.aboveWaterFt * share
    return [toPaper(view, { x: edge, y }), toPaper(view, { x: stationFt, y })]
  })
  return [
    { kind: 'polyline', lines: rails, stroke: pens.panel },
    { kind: 'polyline', lines: stations.slice(0, -1).map(post), stroke: pens.panel },
    polyline(post(stationFt), pens.finished, 'closing-post'),
  ]
}
