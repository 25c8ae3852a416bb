import { lineMm, typeMm } from '../pens.js'
import { polygon, textAt } from '../shape-makers.js'
import type { Point, Shape, TextShape, Tone } from '../shapes.js'
import { backedText } from './backed-text.js'

interface LevelMarkRequest {
  /** The point on the water line that the triangle stands on. */
  at: Point
  label: string
  ground: Tone
}

/** Where the elevation is written beside a mark at `at`. */
export const levelMarkText = (at: Point, label: string): TextShape =>
  textAt(label, { x: at.x - 3, y: at.y - 1 }, { align: 'right', tone: 'water', sizeMm: typeMm.small })

/** The open triangle standing on a water line, two short strokes under it, and the elevation beside. */
export function levelMark({ at, label, ground }: LevelMarkRequest): Shape[] {
  const triangle = [at, { x: at.x - 1.7, y: at.y - 2.6 }, { x: at.x + 1.7, y: at.y - 2.6 }]
  const strokes = [1, 2].map((row) => [
    { x: at.x - 1.7 + row * 0.5, y: at.y + row * 0.8 },
    { x: at.x + 1.7 - row * 0.5, y: at.y + row * 0.8 },
  ])
  return [
    ...backedText(levelMarkText(at, label), ground),
    polygon(triangle, { fill: 'paper', stroke: { tone: 'water', widthMm: lineMm.fine } }),
    { kind: 'polyline', lines: strokes, stroke: { tone: 'water', widthMm: lineMm.fine } },
  ]
}
