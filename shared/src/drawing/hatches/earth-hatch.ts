import { stopsAlong } from '../geometry/along-line.js'
import { pens } from '../pens.js'
import type { Point, PolylineShape } from '../shapes.js'

/** Strokes at 45° in threes hanging under a line: the sign of natural ground. */
export function earthHatch(line: readonly Point[], stepMm = 9): PolylineShape {
  const strokes = stopsAlong(line, stepMm).flatMap(({ at }) =>
    [0, 1, 2].map((place) => {
      const x = at.x + place * 1.1
      const y = at.y + 0.9 + place * 0.05
      return [
        { x, y },
        { x: x - 1.7, y: y + 1.7 },
      ]
    }),
  )
  return { kind: 'polyline', lines: strokes, stroke: pens.soilHatch }
}
