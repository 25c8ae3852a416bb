import { stoneHatch, stoneOnPaperMm } from '../hatches/stone-hatch.js'
import { pens } from '../pens.js'
import { polygon, polyline } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'
import { lineToPaper } from '../view.js'
import { onAxis, type PlanAxis } from './plan-axis.js'

interface Strip {
  from: number
  to: number
  left: number
  right: number
}

export const stripRing = (axis: PlanAxis, { from, to, left, right }: Strip): Point[] => [
  onAxis(axis, from, left),
  onAxis(axis, from, -right),
  onAxis(axis, to, -right),
  onAxis(axis, to, left),
]

export interface BermFootprint {
  left: number
  right: number
  from: number
  to: number
  crestFrom: number
  crestTo: number
}

/** How far the berm reaches on either side of the center line and up and down the hill. */
export function bermFootprint(model: SheetModel): BermFootprint | null {
  if (!model.berm) return null
  const { plan, value } = model.berm
  const half = model.ramp.widthFt / 2
  const crestFrom = plan.crestStationFt - plan.topWidthFt / 2
  const crestTo = plan.crestStationFt + plan.topWidthFt / 2
  return {
    left: half + plan.pastLeftFt,
    right: half + plan.pastRightFt,
    from: crestFrom - value.upslopeReachFt,
    to: crestTo + value.downslopeReachFt,
    crestFrom,
    crestTo,
  }
}

/** The ground that the works cover, so that no label is put on it. */
export function solidRings(model: SheetModel, axis: PlanAxis): Point[][] {
  const half = model.ramp.widthFt / 2
  const from = model.pad?.fromStationFt ?? model.profile.topStationFt
  const foot = bermFootprint(model)
  const rock = stripRing(axis, { from, to: model.profile.toeStationFt, left: half, right: half })
  return [rock, ...(foot ? [stripRing(axis, foot)] : [])]
}

/** Ramp, pad and berm from above. */
export function planWorks(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const half = model.ramp.widthFt / 2
  const { topStationFt, toeStationFt } = model.profile
  const stoneMm = stoneOnPaperMm(model.layers[0]?.stoneSizeIn ?? 2, view.horizontalMmPerFt)
  // On a small plan stones would be dust: the tone alone says rock.
  const hasStones = view.horizontalMmPerFt >= 0.5
  const rock = (strip: Strip, seed: number) => {
    const ring = lineToPaper(view, stripRing(axis, strip))
    return [
      polygon(ring, { fill: 'stone' }),
      ...(hasStones ? [stoneHatch({ ring, stoneMm, slope: 0, seed })] : []),
      polygon(ring, { stroke: pens.outline }),
    ]
  }
  const pad = model.pad
  const padHalf = (pad?.widthFt ?? 0) / 2
  return [
    ...(pad ? rock({ from: pad.fromStationFt, to: pad.toStationFt, left: padHalf, right: padHalf }, 61) : []),
    ...rock({ from: topStationFt, to: toeStationFt, left: half, right: half }, 62),
    ...berm(model, axis, view),
  ]
}

function berm(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const foot = bermFootprint(model)
  if (!foot) return []
  const ring = lineToPaper(view, stripRing(axis, foot))
  const crest = [foot.crestFrom, foot.crestTo].map((station) =>
    lineToPaper(view, [onAxis(axis, station, foot.left), onAxis(axis, station, -foot.right)]),
  )
  return [
    polygon(ring, { fill: 'earthFill', stroke: pens.fine }, 'berm-plan'),
    { kind: 'polyline', lines: [...crest, ...slopeStrokes(axis, foot, view)], stroke: pens.fine },
  ]
}

/** Short strokes from the crest down either side: the sign of a bank. */
function slopeStrokes(axis: PlanAxis, foot: BermFootprint, view: View): Point[][] {
  const stepFt = 3 / view.horizontalMmPerFt
  const count = Math.floor((foot.left + foot.right) / stepFt)
  return Array.from({ length: count }, (_, index) => foot.left - (index + 0.5) * stepFt).flatMap(
    (left, index) => {
      const share = index % 2 === 0 ? 0.75 : 0.4
      const up = foot.crestFrom - (foot.crestFrom - foot.from) * share
      const down = foot.crestTo + (foot.to - foot.crestTo) * share
      return [
        lineToPaper(view, [onAxis(axis, foot.crestFrom, left), onAxis(axis, up, left)]),
        lineToPaper(view, [onAxis(axis, foot.crestTo, left), onAxis(axis, down, left)]),
      ]
    },
  )
}

/** Where runoff goes: an arrow in the channel above the berm toward each outlet. */
export function bermArrows(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const foot = bermFootprint(model)
  if (!foot || !model.berm) return []
  const { falls } = model.berm.plan
  const station = foot.from - 2.5
  const sides = falls === 'both' ? [1, -1] : [falls === 'left' ? 1 : -1]
  return sides.map((side) => {
    const reach = side > 0 ? foot.left : foot.right
    const start = falls === 'both' ? 0 : -side * (side > 0 ? foot.right : foot.left) * 0.6
    const line = [onAxis(axis, station, start), onAxis(axis, station, side * (reach - 1))]
    return arrow(lineToPaper(view, line))
  })
}

export function arrow(line: Point[]): Shape {
  const [from, to] = [line[0] ?? { x: 0, y: 0 }, line.at(-1) ?? { x: 0, y: 0 }]
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1
  const ux = (to.x - from.x) / length
  const uy = (to.y - from.y) / length
  const barb = (side: number) => ({
    x: to.x - ux * 2.6 + side * uy * 1.2,
    y: to.y - uy * 2.6 - side * ux * 1.2,
  })
  return { kind: 'polyline', lines: [line, [barb(1), to, barb(-1)]], stroke: { tone: 'water', widthMm: 0.5 } }
}

/** The center line with the stations that are set out on it. */
export function centerLine(model: SheetModel, axis: PlanAxis, view: View): Shape[] {
  const from = (bermFootprint(model)?.from ?? model.profile.topStationFt) - 6
  const to = (model.closing?.stationFt ?? model.profile.toeStationFt) + 6
  const line = lineToPaper(view, [onAxis(axis, from), onAxis(axis, to)])
  return [polyline(line, { tone: 'ink', widthMm: 0.25, dashMm: [6, 1.2, 1.2, 1.2] }, 'center-line')]
}
