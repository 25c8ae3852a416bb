import { earthHatch } from '../hatches/earth-hatch.js'
import { waterHatch } from '../hatches/water-hatch.js'
import { clipPolygon } from '../geometry/clip-polygon.js'
import { clipPolyline } from '../geometry/clip-polyline.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper, toPaper } from '../view.js'
import { levelAt } from '../level-at.js'
import { lowered, plumbFactor } from './profile-rock.js'
import { bermOutline, endLine, existingLine, rockSurface, solidLine } from './solid-line.js'

/** The mass of the hill: earth, fill, berm and water, as areas. Lines come over it later. */
export function profileGround(model: SheetModel, view: View): Shape[] {
  return [...earth(model, view), ...fillAreas(model, view), ...water(model, view), ...berm(model, view)]
}

function earth(model: SheetModel, view: View): Shape[] {
  const line = lineToPaper(view, solidLine(model))
  const bottom = view.clip.bottom
  const ends = [line.at(-1), line[0]].flatMap((end) => (end ? [{ x: end.x, y: bottom }] : []))
  return [polygon([...line, ...ends], { fill: 'earthTint' }, 'earth')]
}

/** Earth put under the rock: wherever the bottom of the rock stands above the existing ground. */
function fillAreas(model: SheetModel, view: View): Shape[] {
  const sections = model.earthwork?.sections ?? []
  return sections.slice(1).flatMap((after, index) => {
    const before = sections[index]
    if (!before) return []
    const isFill = before.fillAreaFt2 > 0 || after.fillAreaFt2 > 0
    if (!isFill || before.formationFt < before.groundFt - 1e-6 || after.formationFt < after.groundFt - 1e-6)
      return []
    const ring = [
      { x: before.stationFt, y: before.formationFt },
      { x: after.stationFt, y: after.formationFt },
      { x: after.stationFt, y: after.groundFt },
      { x: before.stationFt, y: before.groundFt },
    ]
    return [polygon(lineToPaper(view, ring), { fill: 'earthFill' }, 'fill')]
  })
}

/** Water up to full pool, over whatever will be solid. */
function water(model: SheetModel, view: View): Shape[] {
  const ring = clipPolygon(waterRing(model, view), view.clip)
  return ring.length < 3 ? [] : [polygon(ring, { fill: 'waterTint' }, 'water'), waterHatch(ring)]
}

function waterRing(model: SheetModel, view: View): Point[] {
  const level = model.site.fullPoolElevationFt
  const edge = model.profile.fullPoolEdgeStationFt
  const bed = solidLine(model).filter((point) => point.x > edge)
  const last = bed.at(-1)
  if (!last) return []
  return lineToPaper(view, [{ x: edge, y: level }, ...bed, { x: last.x, y: level }])
}

function berm(model: SheetModel, view: View): Shape[] {
  const outline = lineToPaper(view, bermOutline(model))
  if (outline.length === 0) return []
  return [polygon(outline, { fill: 'earthFill' }, 'berm'), polyline(outline, pens.finished, 'berm-line')]
}

/** Existing ground dashed, finished solid, earth strokes under the ground that is left as it is. */
export function profileLines(model: SheetModel, view: View): Shape[] {
  const existing = lineToPaper(view, existingLine(model))
  const finished = model.profile.surface.map((p) => toPaper(view, { x: p.stationFt, y: p.elevationFt }))
  const left = (model.pad?.fromStationFt ?? model.profile.surface[0]?.stationFt ?? 0) - 1
  const right = (endLine(model).at(-1)?.x ?? model.profile.toeStationFt) + 1
  const parts = [cutLine(model, -Infinity, left), cutLine(model, right, Infinity)]
  return [
    ...parts
      .flatMap((line) => clipPolyline(lineToPaper(view, line), view.clip))
      .map((line) => earthHatch(line)),
    ...earthUnderRock(model, view),
    polyline(existing, pens.existing, 'existing'),
    polyline(finished, pens.finished, 'finished'),
    polyline(lineToPaper(view, endLine(model)), pens.outline, 'end'),
  ]
}

/** The part of the ground between two stations. */
function cutLine(model: SheetModel, from: number, to: number): Point[] {
  const inside = existingLine(model).filter((p) => p.x > from && p.x < to)
  const edge = (x: number) => (Number.isFinite(x) ? [{ x, y: levelAt(model.ground, x) }] : [])
  return [...edge(from), ...inside, ...edge(to)]
}

function earthUnderRock(model: SheetModel, view: View): Shape[] {
  const bottom = lowered(rockSurface(model), (model.layers.at(-1)?.bottomFt ?? 0) * plumbFactor(model))
  const paper = lineToPaper(view, bottom).map(({ x, y }) => ({ x, y: y + 0.6 }))
  return clipPolyline(paper, view.clip).map((line) => earthHatch(line))
}
