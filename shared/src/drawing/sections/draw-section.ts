import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { earthHatch } from '../hatches/earth-hatch.js'
import { stoneHatch, stoneOnPaperMm } from '../hatches/stone-hatch.js'
import { waterHatch } from '../hatches/water-hatch.js'
import { clipPolygon } from '../geometry/clip-polygon.js'
import { dimension } from '../marks/dimension.js'
import { levelMark } from '../marks/level-mark.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper, toGround, toPaper } from '../view.js'
import { finishedHalf, mirrored, sectionShape } from './section-shape.js'
import type { ChosenSection } from './section-stations.js'

/** One section across the ramp, seen from the hill toward the water, in true shape. */
export function drawSection(model: SheetModel, { section }: ChosenSection, view: View): Shape[] {
  const half = toGround(view, { x: view.clip.right, y: 0 }).x
  const ground: Point[] = [
    { x: -half, y: section.groundFt },
    { x: half, y: section.groundFt },
  ]
  const finished = mirrored([...finishedHalf(model, section), { x: half, y: section.groundFt }])
  const finishedPaper = lineToPaper(view, finished)
  const bottom = view.clip.bottom
  const earth = [...finishedPaper, { x: view.clip.right, y: bottom }, { x: view.clip.left, y: bottom }]
  const reach = sectionShape(model, section).halfReach
  const beside = [
    [
      { x: -half, y: section.groundFt },
      { x: -reach, y: section.groundFt },
    ],
    [
      { x: reach, y: section.groundFt },
      { x: half, y: section.groundFt },
    ],
  ]
  return [
    polygon(earth, { fill: 'earthTint' }),
    ...water(model, section.finishedFt, finished, view),
    ...earthwork(model, { section, name: '' }, view),
    ...rock(model, { section, name: '' }, view),
    ...beside.map((line) => earthHatch(lineToPaper(view, line))),
    polyline(lineToPaper(view, ground), pens.existing),
    polyline(finishedPaper, pens.outline, `section-${section.stationFt}`),
    ...marks(model, { section, name: '' }, view),
  ]
}

/** Fill under the rock and earth put back beside it. */
function earthwork(model: SheetModel, { section }: ChosenSection, view: View): Shape[] {
  const shape = sectionShape(model, section)
  const isFill = section.groundFt < section.formationFt
  const half = isFill
    ? [
        { x: shape.halfFormation, y: section.formationFt },
        { x: shape.halfReach, y: section.groundFt },
      ]
    : [
        { x: shape.halfFormation, y: section.formationFt },
        { x: shape.halfBackfill, y: shape.backfillFt },
        { x: shape.halfRock((section.finishedFt - shape.backfillFt) / shape.plumb), y: shape.backfillFt },
      ]
  const rings = isFill ? [mirrored(half)] : [half, half.map(({ x, y }) => ({ x: -x, y }))]
  return rings.map((ring) => polygon(lineToPaper(view, ring), { fill: 'earthFill' }))
}

function rock(model: SheetModel, { section }: ChosenSection, view: View): Shape[] {
  const shape = sectionShape(model, section)
  const at = (depthFt: number) => ({
    half: shape.halfRock(depthFt),
    y: section.finishedFt - depthFt * shape.plumb,
  })
  const layers = model.layers.flatMap((layer, index): Shape[] => {
    const top = at(layer.topFt)
    const low = at(layer.bottomFt)
    const ring = lineToPaper(
      view,
      mirrored([
        { x: top.half, y: top.y },
        { x: low.half, y: low.y },
      ]),
    )
    const stoneMm = stoneOnPaperMm(layer.stoneSizeIn, view.horizontalMmPerFt)
    const fill = layer.role === 'base' ? ('stoneDark' as const) : ('stone' as const)
    return [polygon(ring, { fill }), stoneHatch({ ring, stoneMm, slope: 0, seed: 40 + index })]
  })
  return [...layers, ...fabric(model, { section, name: '' }, view)]
}

function fabric(model: SheetModel, { section }: ChosenSection, view: View): Shape[] {
  if (!model.fabric) return []
  const shape = sectionShape(model, section)
  const up = Math.min(model.fabric.plan.sideTurnUpFt, shape.thicknessFt)
  const turned = {
    x: shape.halfRock(shape.thicknessFt - up) + 0.08,
    y: section.formationFt + up * shape.plumb,
  }
  const line = mirrored([{ x: shape.halfFormation, y: section.formationFt }, turned])
  return [polyline(lineToPaper(view, line), pens.fabric)]
}

function water(model: SheetModel, finishedFt: number, finished: Point[], view: View): Shape[] {
  const level = model.site.fullPoolElevationFt
  if (finishedFt >= level - 0.02) return []
  const first = finished[0]
  const last = finished.at(-1)
  if (!first || !last) return []
  const ring = clipPolygon(
    lineToPaper(view, [{ x: first.x, y: level }, ...finished, { x: last.x, y: level }]),
    view.clip,
  )
  const line = lineToPaper(view, [
    { x: first.x, y: level },
    { x: last.x, y: level },
  ])
  return [polygon(ring, { fill: 'waterTint' }), waterHatch(ring), polyline(line, pens.fullPool)]
}

function marks(model: SheetModel, { section }: ChosenSection, view: View): Shape[] {
  const level = model.site.fullPoolElevationFt
  const half = model.ramp.widthFt / 2
  const isWet = section.finishedFt < level - 0.02
  const ends = [-half, half].map((x) => toPaper(view, { x, y: section.finishedFt })) as [Point, Point]
  const y =
    Math.min(ends[0].y, toPaper(view, { x: 0, y: Math.max(section.groundFt, isWet ? level : -Infinity) }).y) -
    4.5
  const width = dimension({
    from: { x: ends[0].x, y },
    to: { x: ends[1].x, y },
    label: feetAndInches(model.ramp.widthFt),
    witness: ends.map((end) => ({ x: end.x, y: end.y - 0.6 })) as [Point, Point],
  })
  const pool = toPaper(view, { x: 0, y: level })
  const mark = isWet
    ? levelMark({ at: { x: view.clip.right - 4, y: pool.y }, label: numberText(level, 2), ground: 'paper' })
    : []
  return [...width, ...mark]
}
