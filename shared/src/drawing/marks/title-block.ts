import { pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { Box, Shape, TextShape } from '../shapes.js'
import { ringOf } from '../geometry/boxes.js'
import { fittingSizeMm, wrapText } from '../text-width.js'

export interface SheetTitle {
  district: string
  jobTitle: string
  jobNumber: string
  revision: number
  sheetNumber: number
  sheetCount: number
  designedBy: string
  designedOn: string
  checkedBy: string
  levels: string
  isExample: boolean
}

interface Cell {
  name: string
  value: string
  /** Left and right as shares of the block's width. */
  from: number
  to: number
  isTitle?: boolean
}

const rowsOf = (title: SheetTitle): Cell[][] => [
  [
    {
      name: title.isExample ? `${title.district} · example data` : title.district,
      value: title.jobTitle,
      from: 0,
      to: 0.62,
      isTitle: true,
    },
    { name: 'Job', value: title.jobNumber, from: 0.62, to: 0.82 },
    { name: 'Sheet', value: `${title.sheetNumber} of ${title.sheetCount}`, from: 0.82, to: 1 },
  ],
  [
    { name: 'Designed', value: `${title.designedBy}, ${title.designedOn}`, from: 0, to: 0.42 },
    { name: 'Checked', value: title.checkedBy, from: 0.42, to: 0.82 },
    { name: 'Revision', value: String(title.revision), from: 0.82, to: 1 },
  ],
  [
    { name: 'Levels', value: title.levels, from: 0, to: 0.42 },
    {
      name: 'Before digging',
      value: 'Call the utility-locating service. Await written approval.',
      from: 0.42,
      to: 1,
    },
  ],
]

/** The block at the bottom right of each sheet. */
export function titleBlock(box: Box, title: SheetTitle): Shape[] {
  const rows = rowsOf(title)
  const rowMm = (box.bottom - box.top) / rows.length
  const width = box.right - box.left
  const cells = rows.flatMap((row, index) =>
    row.flatMap((cell) => {
      const left = box.left + cell.from * width
      const top = box.top + index * rowMm
      return cellShapes(cell, { left, top, right: box.left + cell.to * width, bottom: top + rowMm })
    }),
  )
  return [polygon(ringOf(box), { stroke: pens.outline }), ...cells]
}

function cellShapes({ name, value, isTitle }: Cell, box: Box): Shape[] {
  const inner = box.right - box.left - 4
  const left = box.left + 2
  const weight = isTitle ? ('bold' as const) : ('regular' as const)
  const sizesMm = isTitle ? [typeMm.view, typeMm.text, 3.3] : [typeMm.text, 3.4, typeMm.small, 2.8]
  const sizeMm = fittingSizeMm({ text: value, weight, widthMm: inner, sizesMm })
  const lines = wrapText({ text: value, weight, sizeMm, widthMm: inner }).slice(0, 2)
  const base = lines.length === 1 ? box.top + 8.8 : box.top + 7
  const texts = lines.map((text, index): TextShape =>
    textAt(text, { x: left, y: base + index * (sizeMm + 0.2) }, { weight, sizeMm }),
  )
  const sizeOfName = fittingSizeMm({
    text: name,
    weight: 'regular',
    widthMm: inner,
    sizesMm: [2.9, 2.6, 2.3],
  })
  return [
    polyline(
      [
        { x: box.left, y: box.bottom },
        { x: box.right, y: box.bottom },
        { x: box.right, y: box.top },
      ],
      pens.fine,
    ),
    textAt(name, { x: left, y: box.top + 3.6 }, { sizeMm: sizeOfName, tone: 'mute' }),
    ...texts,
  ]
}
