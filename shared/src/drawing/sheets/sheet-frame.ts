import { insetBox, ringOf } from '../geometry/boxes.js'
import { legend, type LegendKey } from '../marks/legend.js'
import { titleBlock, type SheetTitle } from '../marks/title-block.js'
import { paper, pens, typeMm } from '../pens.js'
import { polygon, polyline, textAt } from '../shape-makers.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Point, Shape } from '../shapes.js'
import { textWidthMm } from '../text-width.js'

const BLOCK_MM = { height: 36, width: 146 }

export const sheetBorder: Box = insetBox(
  { left: 0, top: 0, right: paper.widthMm, bottom: paper.heightMm },
  paper.marginMm,
)

/** The room between the border and the title block. */
export const sheetRoom: Box = {
  left: sheetBorder.left + 5,
  top: sheetBorder.top + 4,
  right: sheetBorder.right - 5,
  bottom: sheetBorder.bottom - BLOCK_MM.height - 3,
}

/** Border, title block and legend: the same on every sheet. */
export function sheetFrame(model: SheetModel, title: SheetTitle, keys: readonly LegendKey[]): Shape[] {
  const top = sheetBorder.bottom - BLOCK_MM.height
  const left = sheetBorder.right - BLOCK_MM.width
  const block = { left, top, right: sheetBorder.right, bottom: sheetBorder.bottom }
  const keysBox = { left: sheetRoom.left, top: top + 1.5, right: left - 2, bottom: sheetBorder.bottom - 1.5 }
  return [
    ...legend(keysBox, keys, model.site.body),
    ...titleBlock(block, title),
    polyline(
      [
        { x: sheetBorder.left, y: top },
        { x: sheetBorder.right, y: top },
      ],
      pens.outline,
    ),
    polygon(ringOf(sheetBorder), { stroke: pens.border }),
  ]
}

/** A view's heading: its name, and its scale beside it. */
export function viewHeading(at: Point, title: string, note: string): Shape[] {
  const width = textWidthMm({ text: title, sizeMm: typeMm.title, weight: 'bold' })
  return [
    textAt(title, at, { weight: 'bold', sizeMm: typeMm.title }),
    textAt(note, { x: at.x + width + 3, y: at.y }, { tone: 'mute', sizeMm: 3.4 }),
  ]
}
