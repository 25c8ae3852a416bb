import { feetAndInches } from '../../format/feet-and-inches.js'
import { earthHatch } from '../hatches/earth-hatch.js'
import { stoneHatch } from '../hatches/stone-hatch.js'
import { backedText } from '../marks/backed-text.js'
import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Box, Point, Shape, View } from '../shapes.js'
import type { SheetModel } from '../sheet-model.js'

type Fabric = NonNullable<SheetModel['fabric']>

const small = { sizeMm: typeMm.small } as const
const THICK_MM = 11
const PAD_MM = 7.5
const EARTH_MM = 11

/** Both ends of the fabric: held at the top, wrapped back over the base stone at the toe. */
export function endsDetail(model: SheetModel, fabric: Fabric, view: View): Shape[] {
  const { left, right, top } = view.clip
  const width = (right - left) / 2 - 4
  const y = top + 19
  return [
    ...topEnd(fabric, model.pad !== null, { left: left + 2, right: left + width, top: y, bottom: y + 30 }),
    ...toeEnd(fabric, { left: left + width + 8, right: right - 2, top: y, bottom: y + 30 }),
  ]
}

interface Slab {
  upper: [Point, Point]
  lower: [Point, Point]
}

/** A length of ramp, falling to the right. */
function slab(from: Point, toX: number, drop: number): Slab {
  const end = { x: toX, y: from.y + drop }
  return {
    upper: [from, end],
    lower: [
      { x: from.x, y: from.y + THICK_MM },
      { x: toX, y: end.y + THICK_MM },
    ],
  }
}

function rock(ring: Point[], slope: number, seed: number): Shape[] {
  return [
    polygon(ring, { fill: 'stone' }),
    stoneHatch({ ring, stoneMm: 2.1, slope, seed }),
    polygon(ring, { stroke: pens.fine }),
  ]
}

function earth(line: Point[]): Shape[] {
  const under = [...line].reverse().map(({ x, y }) => ({ x, y: y + EARTH_MM }))
  return [
    polygon([...line, ...under], { fill: 'earthTint' }),
    earthHatch(line.map(({ x, y }) => ({ x, y: y + 0.8 }))),
  ]
}

function topEnd(fabric: Fabric, hasPad: boolean, frame: Box): Shape[] {
  const start = { x: frame.left + 24, y: frame.top }
  const body = slab(start, frame.right, 5)
  const rampSlope = 5 / (frame.right - start.x)
  const shelf = frame.top + (hasPad ? PAD_MM : 0)
  const hill: Point[] = [{ x: frame.left, y: shelf }, { x: start.x, y: shelf }, ...body.lower]
  const foot = body.lower[0]
  const padRing = [
    { x: frame.left, y: frame.top },
    start,
    { x: start.x, y: shelf },
    { x: frame.left, y: shelf },
  ]
  const overlap = [
    { x: frame.left, y: shelf },
    { x: start.x, y: shelf },
    { x: start.x + 3, y: foot.y - 0.9 },
    { x: start.x + 16, y: foot.y - 0.9 + 16 * rampSlope },
  ]
  const trench = [
    { x: start.x - 8, y: foot.y + 7 },
    { x: start.x - 2, y: foot.y + 7 },
    { x: start.x - 2, y: foot.y },
    foot,
  ]
  const text = hasPad
    ? `pad fabric laps ${feetAndInches(fabric.plan.lapDryFt)} over the ramp's`
    : `anchored ${feetAndInches(fabric.plan.topAnchorFt)} at the top`
  return [
    ...earth(hill),
    ...(hasPad ? rock(padRing, 0, 8) : []),
    ...rock([...body.upper, ...[...body.lower].reverse()], rampSlope, 9),
    polyline(body.lower, pens.fabric),
    polyline(hasPad ? overlap : trench, pens.fabric),
    ...backedText(textAt(text, { x: frame.left, y: frame.top - 4 }, small), 'paper'),
    textAt('at the top', { x: frame.left, y: frame.bottom + 7 }, { ...small, tone: 'mute' }),
  ]
}

function toeEnd(fabric: Fabric, frame: Box): Shape[] {
  const end = frame.right - 15
  const body = slab({ x: frame.left, y: frame.top }, end, 6)
  const slope = 6 / (end - frame.left)
  const last = body.lower[1]
  const bed: Point[] = [...body.lower, { x: end + 5, y: last.y - 5 }, { x: frame.right, y: last.y - 5 }]
  const middle = last.y - THICK_MM / 2
  const wrap: Point[] = [...body.lower, { x: end, y: middle }, { x: end - 20, y: middle - 20 * slope }]
  const text = `wrapped back ${feetAndInches(fabric.plan.toeWrapFt)}, stone on top`
  return [
    ...earth(bed),
    ...rock([...body.upper, ...[...body.lower].reverse()], slope, 10),
    polyline(wrap, pens.fabric),
    ...backedText(textAt(text, { x: frame.left, y: frame.top - 4 }, small), 'paper'),
    textAt('at the toe', { x: frame.left, y: frame.bottom + 7 }, { ...small, tone: 'mute' }),
  ]
}
