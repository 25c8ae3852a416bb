import type { LabelRoom } from '../label-room.js'
import { typeMm } from '../pens.js'
import { textAt } from '../shape-makers.js'
import type { Point, Shape, TextShape, Tone } from '../shapes.js'
import { leader, leaderLine } from './leader.js'

export type Side = 'left' | 'right'

export interface Name {
  target: Point
  text: string
  /** Sides to try, the better one first. */
  sides: Side[]
  ground: Tone
  /** Steps up (negative) or down to try, when not every direction will do. */
  downMm?: readonly number[]
}

const ACROSS_MM = [8, 14, 22, 32, 44]
const DOWN_MM = [-4, 4, -9, 9, -15, 15, -22, 22]

/** Puts each name at the first free place beside its thing, so that neither text nor stroke runs into another. */
export function placeNames(names: readonly Name[], room: LabelRoom): Shape[] {
  return names.flatMap(({ target, text, sides, ground, downMm }) => {
    const places = ACROSS_MM.flatMap((dx) =>
      (downMm ?? DOWN_MM).flatMap((dy) =>
        sides.map((side) => ({ side, text: besideText(target, text, side, { dx, dy }) })),
      ),
    )
    const free = places.filter(({ text: label, side }) => room.isLineFree(leaderLine(target, label.at, side)))
    const place = room.firstFree(free)
    if (!place) return []
    const at = place.text.at
    const shapes = leader({ target, at, text, side: place.side, ground, sizeMm: typeMm.small })
    room.take(shapes)
    room.takeLine(leaderLine(target, at, place.side))
    return shapes
  })
}

export function besideText(
  target: Point,
  text: string,
  side: Side,
  by: { dx: number; dy: number },
): TextShape {
  const at = { x: target.x + (side === 'left' ? -by.dx : by.dx), y: target.y + by.dy + 1.2 }
  return textAt(text, at, { align: side === 'left' ? 'right' : 'left', sizeMm: typeMm.small })
}
