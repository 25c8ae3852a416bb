import { feetAndInches } from '../../format/feet-and-inches.js'
import { formatPercent } from '../../format/format-percent.js'
import { formatRatio } from '../../format/format-ratio.js'
import { boundsOf, insetBox } from '../geometry/boxes.js'
import { levelNames } from '../level-names.js'
import type { LabelRoom } from '../label-room.js'
import { levelAt } from '../level-at.js'
import { dimension } from '../marks/dimension.js'
import { backedText } from '../marks/backed-text.js'
import { textAt } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { toPaper } from '../view.js'
import { endLine, solidLine } from './solid-line.js'

/** Rows of dimensions hang from the view's top, since the air over the water is the free part of a profile. */
const ROWS_MM = [7, 15]

export function profileDimensions(model: SheetModel, view: View, room: LabelRoom): Shape[] {
  const { profile, pad } = model
  const solid = solidLine(model).map((p) => ({ stationFt: p.x, elevationFt: p.y }))
  const across = (from: number, to: number, row: number, label: string, id?: string) => {
    const y = view.clip.top + (ROWS_MM[row] ?? 7)
    const ends = [from, to].map((station) => toPaper(view, { x: station, y: levelAt(solid, station) }))
    const [start, end] = ends as [Point, Point]
    const lifted = ends.map((p) => ({ x: p.x, y: p.y - 1 })) as [Point, Point]
    return dimension({
      from: { x: start.x, y },
      to: { x: end.x, y },
      label,
      witness: lifted,
      shortSide: 'left',
      ...(id ? { id } : {}),
    })
  }
  const slope = `Ramp ${feetAndInches(profile.runFt)} level, ${feetAndInches(profile.slopeLengthFt)} on the slope`
  const wet = `under water at ${levelNames[model.site.body].high} ${feetAndInches(profile.wetRunAtFullFt)}`
  const shapes = [
    ...(pad ? across(pad.fromStationFt, pad.toStationFt, 0, `Pad ${feetAndInches(pad.lengthFt)}`) : []),
    ...across(profile.topStationFt, profile.toeStationFt, 0, slope, 'run'),
    ...across(profile.fullPoolEdgeStationFt, profile.toeStationFt, 1, wet),
    ...toeDepth(model, view),
  ]
  room.take(shapes)
  // A label may stand on neither a dimension line nor the water's depth.
  const lines = shapes.flatMap((shape) => (shape.kind === 'polyline' ? shape.lines : []))
  lines.forEach((line) => room.takeBox(insetBox(boundsOf(line), -0.3)))
  return shapes
}

/** How deep the toe lies below full pool, on the water side of everything that stands there. */
function toeDepth(model: SheetModel, view: View): Shape[] {
  const { profile, site, closing } = model
  const station = Math.max(endLine(model).at(-1)?.x ?? profile.toeStationFt, closing?.stationFt ?? 0)
  const x = toPaper(view, { x: station, y: 0 }).x + 5
  const top = toPaper(view, { x: 0, y: site.fullPoolElevationFt }).y
  const bottom = toPaper(view, { x: 0, y: profile.toeElevationFt }).y
  const depth = feetAndInches(site.fullPoolElevationFt - profile.toeElevationFt)
  if (x > view.clip.right - 24) return []
  return dimension({
    from: { x, y: top },
    to: { x, y: bottom },
    label: depth,
    ground: 'waterTint',
    id: 'toe-depth',
  })
}

/** The grade written along the slope, turned as the slope is drawn. */
export function gradeLabel(model: SheetModel, view: View, room: LabelRoom): Shape[] {
  const { profile, ramp } = model
  const top = toPaper(view, { x: profile.topStationFt, y: profile.topElevationFt })
  const toe = toPaper(view, { x: profile.toeStationFt, y: profile.toeElevationFt })
  const angleDeg = (-Math.atan2(toe.y - top.y, toe.x - top.x) * 180) / Math.PI
  const share = 0.55
  const at = { x: top.x + (toe.x - top.x) * share + 1, y: top.y + (toe.y - top.y) * share - 2.2 }
  const text = textAt(gradeText(ramp.gradeRunPerRise), at, { align: 'center', weight: 'bold', angleDeg })
  const stationFt = profile.topStationFt + profile.runFt * share
  const isWet = stationFt > profile.fullPoolEdgeStationFt
  const shapes = backedText({ ...text, id: 'grade-label' }, isWet ? 'waterTint' : 'paper')
  room.take(shapes)
  return shapes
}

export const gradeText = (runPerRise: number) =>
  `${formatRatio(runPerRise)} (${formatPercent(100 / runPerRise)})`
