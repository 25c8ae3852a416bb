import { pens, typeMm } from '../pens.js'
import { polygon, textAt } from '../shape-makers.js'
import type { Point, Shape, View } from '../shapes.js'

const lengthsFt = [0.5, 1, 2, 4, 5, 10, 20, 40, 50, 100, 200, 400, 500, 1000]
const PARTS = 4
const HEIGHT_MM = 1.5

/** Length of the bar in feet: the longest round one within the room. */
export function scaleBarFt(view: View, roomMm: number): number {
  const fitting = lengthsFt.filter((length) => length * view.horizontalMmPerFt <= roomMm)
  return fitting.at(-1) ?? lengthsFt[0] ?? 1
}

/** A bar in four parts whose right end is at `right`; it stays true when a copier shrinks the sheet. */
export function scaleBar({
  view,
  right,
  roomMm = 52,
}: {
  view: View
  right: Point
  roomMm?: number
}): Shape[] {
  const lengthFt = scaleBarFt(view, roomMm)
  const lengthMm = lengthFt * view.horizontalMmPerFt
  const left = right.x - lengthMm
  const part = (index: number) => left + (lengthMm * index) / PARTS
  const boxes = Array.from({ length: PARTS }, (_, index) =>
    polygon(
      [
        { x: part(index), y: right.y },
        { x: part(index + 1), y: right.y },
        { x: part(index + 1), y: right.y + HEIGHT_MM },
        { x: part(index), y: right.y + HEIGHT_MM },
      ],
      { fill: index % 2 === 0 ? 'ink' : 'paper', stroke: pens.fine },
      `scale-bar-${view.key}`,
    ),
  )
  const labels = [0, PARTS / 2, PARTS].map((index) => {
    const text = `${(lengthFt * index) / PARTS}${index === PARTS ? ' ft' : ''}`
    return textAt(text, { x: part(index), y: right.y - 1 }, { align: 'center', sizeMm: typeMm.small })
  })
  return [...boxes, ...labels]
}
