import { earthHatch } from '../hatches/earth-hatch.js'
import { stoneHatch } from '../hatches/stone-hatch.js'
import { waterHatch } from '../hatches/water-hatch.js'
import { ringOf } from '../geometry/boxes.js'
import { levelNames } from '../level-names.js'
import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Box, Point, Shape, Stroke, Tone } from '../shapes.js'

const SWATCH = { widthMm: 12, heightMm: 5.6 }

type Swatch = (box: Box) => Shape[]

const filled =
  (fill: Tone, hatch?: (ring: Point[], box: Box) => Shape): Swatch =>
  (box) => [
    polygon(ringOf(box), { fill }),
    ...(hatch ? [hatch(ringOf(box), box)] : []),
    polygon(ringOf(box), { stroke: pens.fine }),
  ]

const stroked =
  (stroke: Stroke): Swatch =>
  (box) => [
    polyline(
      [
        { x: box.left, y: (box.top + box.bottom) / 2 },
        { x: box.right, y: (box.top + box.bottom) / 2 },
      ],
      stroke,
    ),
  ]

const swatches = {
  earth: [
    'earth',
    filled('earthTint', (_, box) =>
      earthHatch(
        [
          { x: box.left + 2, y: box.top + 0.6 },
          { x: box.right - 3, y: box.top + 0.6 },
        ],
        4.5,
      ),
    ),
  ],
  fill: ['earth fill', filled('earthFill')],
  surface: ['surface stone', filled('stone', (ring) => stoneHatch({ ring, stoneMm: 1, slope: 0, seed: 1 }))],
  base: ['base stone', filled('stoneDark', (ring) => stoneHatch({ ring, stoneMm: 1.5, slope: 0, seed: 2 }))],
  fabric: ['fabric', stroked(pens.fabric)],
  water: ['water', filled('waterTint', (ring) => waterHatch(ring))],
  existing: ['existing ground', stroked(pens.existing)],
  finished: ['finished', stroked(pens.finished)],
  fullPool: ['full pool', stroked(pens.fullPool)],
  waterToday: ['water while building', stroked(pens.waterToday)],
  lowWater: ['low water', stroked(pens.lowWater)],
  fence: ['fence, energized', stroked(pens.fence)],
  closing: ['closing panel', stroked(pens.closing)],
} as const satisfies Record<string, readonly [string, Swatch]>

export type LegendKey = keyof typeof swatches

/** Every hatch and line of the sheet with its name, in columns of three. */
export function legend(box: Box, keys: readonly LegendKey[], body: keyof typeof levelNames): Shape[] {
  const names: { readonly [key: string]: string } = {
    fullPool: levelNames[body].high,
    lowWater: levelNames[body].low,
  }
  const rows = 3
  const columns = Math.ceil(keys.length / rows)
  const columnMm = (box.right - box.left) / columns
  const rowMm = (box.bottom - box.top) / rows
  return keys.flatMap((key, index) => {
    const [name, draw] = swatches[key]
    const left = box.left + Math.floor(index / rows) * columnMm
    const middle = box.top + ((index % rows) + 0.5) * rowMm
    const swatch = {
      left,
      right: left + SWATCH.widthMm,
      top: middle - SWATCH.heightMm / 2,
      bottom: middle + SWATCH.heightMm / 2,
    }
    const label = textAt(
      names[key] ?? name,
      { x: swatch.right + 2, y: middle + 1.1 },
      { sizeMm: typeMm.small },
    )
    return [...draw(swatch), label]
  })
}
