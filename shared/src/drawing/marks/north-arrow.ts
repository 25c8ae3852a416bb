import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Point, Shape } from '../shapes.js'

/** North is up the sheet; `at` is the arrow's foot. */
export function northArrow(at: Point, heightMm = 15): Shape[] {
  const tip = { x: at.x, y: at.y - heightMm }
  const shoulder = at.y - heightMm * 0.58
  return [
    polyline([at, tip], pens.outline),
    polygon(
      [tip, { x: at.x + 2.2, y: shoulder }, { x: at.x, y: shoulder - 1.4 }],
      { fill: 'ink' },
      'north-arrow',
    ),
    polygon([tip, { x: at.x - 2.2, y: shoulder }, { x: at.x, y: shoulder - 1.4 }], {
      fill: 'paper',
      stroke: pens.fine,
    }),
    textAt('N', { x: at.x, y: tip.y - 1.4 }, { align: 'center', weight: 'bold', sizeMm: typeMm.view }),
  ]
}
