import { pens, typeMm } from '../pens.js'
import { polyline, textAt } from '../shape-makers.js'
import type { Point, Shape, Tone } from '../shapes.js'
import { textWidthMm } from '../text-width.js'
import { backedText } from './backed-text.js'

interface DimensionRequest {
  from: Point
  to: Point
  label: string
  ground?: Tone
  /** Where the witness lines start, when not at the dimension line itself. */
  witness?: [Point, Point]
  /** On which side of a line too short for it the label stands. */
  shortSide?: 'left' | 'right'
  id?: string
}

const TICK_MM = 1.1

/** A dimension with oblique ticks. The label stands on the line's middle, or beside a line too short for it. */
export function dimension({
  from,
  to,
  label,
  ground = 'paper',
  witness,
  shortSide = 'right',
  id,
}: DimensionRequest): Shape[] {
  const isUpright = Math.abs(to.y - from.y) > Math.abs(to.x - from.x)
  const tick = (p: Point) => [
    { x: p.x - TICK_MM, y: p.y + TICK_MM },
    { x: p.x + TICK_MM, y: p.y - TICK_MM },
  ]
  const witnesses = (witness ?? []).map((start, index) => [start, beyond(start, index === 0 ? from : to)])
  const lines = {
    kind: 'polyline' as const,
    lines: [[from, to], ...witnesses],
    stroke: pens.fine,
    ...(id ? { id } : {}),
  }
  const ticks = { kind: 'polyline' as const, lines: [tick(from), tick(to)], stroke: pens.outline }
  return [lines, ticks, ...(isUpright ? uprightLabel : levelLabel)({ from, to, label, ground, shortSide })]
}

/** Witness lines run a little past the dimension line. */
function beyond(start: Point, end: Point): Point {
  const length = Math.hypot(end.x - start.x, end.y - start.y)
  if (length === 0) return end
  const more = (length + 1.2) / length
  return { x: start.x + (end.x - start.x) * more, y: start.y + (end.y - start.y) * more }
}

interface LabelRequest {
  from: Point
  to: Point
  label: string
  ground: Tone
  shortSide: 'left' | 'right'
}

function uprightLabel({ from, to, label, ground }: LabelRequest): Shape[] {
  const at = { x: from.x + 1.6, y: (from.y + to.y) / 2 + typeMm.small * 0.34 }
  return backedText(textAt(label, at, { sizeMm: typeMm.small }), ground)
}

function levelLabel({ from, to, label, ground, shortSide }: LabelRequest): Shape[] {
  const width = textWidthMm({ text: label, sizeMm: typeMm.text, weight: 'regular' })
  const middle = (from.x + to.x) / 2
  if (width <= Math.abs(to.x - from.x) - 2) {
    return backedText(textAt(label, { x: middle, y: from.y - 1 }, { align: 'center' }), ground)
  }
  const isRight = shortSide === 'right'
  const end = isRight ? Math.max(from.x, to.x) : Math.min(from.x, to.x)
  const out = isRight ? 1 : -1
  const lead = polyline(
    [
      { x: end, y: from.y },
      { x: end + out * 1.6, y: from.y },
    ],
    pens.fine,
  )
  const at = { x: end + out * 2.2, y: from.y + typeMm.text * 0.3 }
  return [lead, ...backedText(textAt(label, at, { align: isRight ? 'left' : 'right' }), ground)]
}
