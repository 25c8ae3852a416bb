import { pens } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Point, Shape, Tone } from '../shapes.js'
import { backedText } from './backed-text.js'

interface LeaderRequest {
  /** The thing that is named. */
  target: Point
  /** Where the text begins (or ends, when it stands left of its target). */
  at: Point
  text: string
  side: 'left' | 'right'
  ground: Tone
  sizeMm?: number
}

/** From beside the text over a short level shoulder to the thing. */
export function leaderLine(target: Point, at: Point, side: 'left' | 'right'): Point[] {
  const away = side === 'left' ? 1 : -1
  return [{ x: at.x + away * 1.2, y: at.y - 1.2 }, { x: at.x + away * 4.2, y: at.y - 1.2 }, target]
}

/** A label with a dot on its thing, a straight stroke, and a short level shoulder beside the text. */
export function leader({ target, at, text, side, ground, sizeMm }: LeaderRequest): Shape[] {
  const label = textAt(text, at, { align: side === 'left' ? 'right' : 'left', ...(sizeMm ? { sizeMm } : {}) })
  return [polyline(leaderLine(target, at, side), pens.fine), dot(target), ...backedText(label, ground)]
}

const dot = (at: Point): Shape =>
  polygon(
    Array.from({ length: 8 }, (_, corner) => ({
      x: at.x + Math.cos((corner * Math.PI) / 4) * 0.55,
      y: at.y + Math.sin((corner * Math.PI) / 4) * 0.55,
    })),
    { fill: 'ink' },
  )
