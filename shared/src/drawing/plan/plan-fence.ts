import { waterHatch } from '../hatches/water-hatch.js'
import { clipPolygon } from '../geometry/clip-polygon.js'
import { stopsAlong } from '../geometry/along-line.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Point, Shape, Tone, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper } from '../view.js'
import { asPoint, onAxis, type PlanAxis } from './plan-axis.js'

/** The water at full pool as walked, or only its edge across the ramp while no outline is known. */
export function planWater(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const outline = model.site.waterOutline?.map(asPoint)
  if (!outline) {
    const station = model.profile.fullPoolEdgeStationFt
    const reach = model.ramp.widthFt
    const edge = lineToPaper(view, [onAxis(axis, station, reach), onAxis(axis, station, -reach)])
    return [polyline(edge, pens.fullPool, 'water-edge')]
  }
  const ring = lineToPaper(view, outline)
  const inView = clipPolygon(ring, view.clip)
  return [
    polygon(ring, { fill: 'waterTint' }, 'water-plan'),
    waterHatch(inView),
    polyline([...ring, ...ring.slice(0, 1)], pens.fullPool),
  ]
}

/** Every run that was drawn on the map, with a cross stroke for its posts; the panel in the water is dashed. */
export function planFence(model: SheetModel, view: View): Shape[] {
  return (model.fence?.plan.runs ?? []).flatMap((run): Shape[] => {
    if (!('points' in run.path)) return []
    const line = lineToPaper(view, run.path.points.map(asPoint))
    if (run.role === 'closing') return [polyline(line, pens.closing, `run-${run.name}`)]
    const stroke = run.energized ? pens.fence : pens.outline
    return [
      polyline(line, stroke, `run-${run.name}`),
      posts(line, run.postSpacingFt * view.horizontalMmPerFt, stroke.tone),
    ]
  })
}

function posts(line: Point[], spacingMm: number, tone: Tone): Shape {
  const strokes = stopsAlong(line, Math.max(spacingMm, 3)).map(({ at, along }) => [
    { x: at.x - along.y * 0.9, y: at.y + along.x * 0.9 },
    { x: at.x + along.y * 0.9, y: at.y - along.x * 0.9 },
  ])
  return { kind: 'polyline', lines: strokes, stroke: { tone, widthMm: 0.25 } }
}
