import { isInPolygon } from '../geometry/point-in-polygon.js'
import { boundsOf } from '../geometry/boxes.js'
import { seeded } from '../geometry/seeded.js'
import { pens } from '../pens.js'
import type { Point, PolylineShape } from '../shapes.js'

const ROW_MM = 5.5

/** Sparse short horizontals; only strokes that lie wholly in the water are drawn. */
export function waterHatch(ring: readonly Point[]): PolylineShape {
  if (ring.length < 3) return { kind: 'polyline', lines: [], stroke: pens.waterHatch }
  const box = boundsOf(ring)
  const random = seeded(11)
  const rowCount = Math.max(0, Math.floor((box.bottom - box.top) / ROW_MM))
  const lines = Array.from({ length: rowCount }, (_, row) => box.top + (row + 0.55) * ROW_MM).flatMap((y) => {
    const strokes: Point[][] = []
    for (let x = box.left + random() * 12; x < box.right; x += 13 + random() * 16) {
      const length = 2.5 + random() * 4
      const stroke = [
        { x, y },
        { x: x + length, y },
      ]
      if (stroke.every((point) => isInPolygon(point, ring))) strokes.push(stroke)
    }
    return strokes
  })
  return { kind: 'polyline', lines, stroke: pens.waterHatch }
}
