import { stoneHatch, stoneOnPaperMm } from '../hatches/stone-hatch.js'
import { levelAt } from '../level-at.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper } from '../view.js'
import { rockSurface } from './solid-line.js'

/** Plumb depth of a layer measured square to the slope. */
export function plumbFactor(model: SheetModel): number {
  const { runFt, slopeLengthFt } = model.profile
  return runFt > 0 ? slopeLengthFt / runFt : 1
}

export const lowered = (line: readonly Point[], byFt: number): Point[] =>
  line.map(({ x, y }) => ({ x, y: y - byFt }))

/** The pad's own surface: it follows the ground landward of the ramp's top. */
export function padSurface(model: SheetModel): Point[] {
  if (!model.pad) return []
  const { fromStationFt, toStationFt } = model.pad
  const between = model.ground.filter((p) => p.stationFt > fromStationFt && p.stationFt < toStationFt)
  const stations = [fromStationFt, ...between.map((p) => p.stationFt), toStationFt]
  return stations.map((x) => ({ x, y: levelAt(model.ground, x) }))
}

/** Rock in its layers, stone by stone, with the fabric as a heavy dashed line under it. */
export function profileRock(model: SheetModel, view: View): Shape[] {
  const surface = rockSurface(model)
  const plumb = plumbFactor(model)
  const layers = model.layers.flatMap((layer, index) =>
    band({
      top: lowered(surface, layer.topFt * plumb),
      bottom: lowered(surface, layer.bottomFt * plumb),
      stoneIn: layer.stoneSizeIn,
      seed: 100 + index,
      view,
      fill: layer.role === 'base' ? 'stoneDark' : 'stone',
      id: `layer-${index}`,
    }),
  )
  return [...layers, ...padRock(model, view), ...fabricLine(model, view)]
}

function padRock(model: SheetModel, view: View): Shape[] {
  const top = padSurface(model)
  if (!model.pad || top.length < 2) return []
  const bottom = lowered(top, model.pad.thicknessIn / 12)
  const stoneIn = model.layers.find(({ role }) => role === 'surface')?.stoneSizeIn ?? 2
  return [
    ...band({ top, bottom, stoneIn, seed: 77, view, fill: 'stone', id: 'pad' }),
    polyline(lineToPaper(view, bottom), pens.fabric),
    polyline(lineToPaper(view, top), pens.finished),
  ]
}

interface Band {
  top: Point[]
  bottom: Point[]
  stoneIn: number
  seed: number
  view: View
  fill: 'stone' | 'stoneDark'
  id: string
}

function band({ top, bottom, stoneIn, seed, view, fill, id }: Band): Shape[] {
  const ring = lineToPaper(view, [...top, ...[...bottom].reverse()])
  const paperTop = lineToPaper(view, top)
  const first = paperTop[0] ?? { x: 0, y: 0 }
  const last = paperTop.at(-1) ?? first
  const slope = last.x === first.x ? 0 : (last.y - first.y) / (last.x - first.x)
  const stoneMm = stoneOnPaperMm(stoneIn, view.horizontalMmPerFt)
  return [polygon(ring, { fill }, id), stoneHatch({ ring, stoneMm, slope, seed })]
}

/** Fabric under the rock: down into the anchor at the top unless a pad laps over it, and wrapped back at the toe. */
function fabricLine(model: SheetModel, view: View): Shape[] {
  const thickness = (model.layers.at(-1)?.bottomFt ?? 0) * plumbFactor(model)
  const bottom = lowered(rockSurface(model), thickness)
  const first = bottom[0]
  const last = bottom.at(-1)
  if (!model.fabric || !first || !last) return []
  const anchor = model.pad
    ? []
    : [
        { x: first.x - 0.5, y: first.y - 1 },
        { x: first.x, y: first.y - 1 },
      ]
  const wrap = [{ x: last.x, y: last.y + Math.min(thickness, model.fabric.plan.toeWrapFt) }]
  return [polyline(lineToPaper(view, [...anchor, ...bottom, ...wrap]), pens.fabric, 'fabric')]
}
