import { feetAndInches } from '../../format/feet-and-inches.js'
import { numberText } from '../../format/number-text.js'
import { bermDetail, bermDetailView } from '../details/berm-detail.js'
import { sketchView } from '../details/detail-view.js'
import { edgeDetail, edgeDetailView } from '../details/edge-detail.js'
import { endsDetail } from '../details/ends-detail.js'
import { lapDetail } from '../details/lap-detail.js'
import { scaleBar } from '../marks/scale-bar.js'
import type { SheetTitle } from '../marks/title-block.js'
import { paper, pens } from '../pens.js'
import { polyline } from '../shape-makers.js'
import type { SheetModel } from '../sheet-model.js'
import type { Box, Shape, Sheet, View } from '../shapes.js'
import { clipToView } from '../view.js'
import { sheetBorder, sheetFrame, sheetRoom, viewHeading } from './sheet-frame.js'

const GAP_MM = 8
const HEAD_MM = 9

interface Detail {
  view: View
  shapes: Shape[]
}

/** What a builder looks up while laying: edge, laps, ends of the fabric, berm. */
export function detailsSheet(model: SheetModel, title: SheetTitle): Sheet {
  const cells = quarters()
  const details = cells.flatMap((cell, index) => {
    const detail = detailAt(model, index, { ...cell, top: cell.top + HEAD_MM })
    return detail ? [{ ...detail, cell }] : []
  })
  const middle = { x: (sheetRoom.left + sheetRoom.right) / 2, y: (sheetRoom.top + sheetRoom.bottom) / 2 }
  return {
    key: 'details',
    title: 'Details',
    widthMm: paper.widthMm,
    heightMm: paper.heightMm,
    border: sheetBorder,
    views: details.map(({ view }) => view),
    shapes: [
      polyline(
        [
          { x: sheetRoom.left, y: middle.y },
          { x: sheetRoom.right, y: middle.y },
        ],
        pens.grid,
      ),
      polyline(
        [
          { x: middle.x, y: sheetRoom.top },
          { x: middle.x, y: sheetRoom.bottom },
        ],
        pens.grid,
      ),
      ...details.flatMap(({ view, shapes, cell }) => [
        ...viewHeading({ x: cell.left, y: cell.top + 5 }, view.title, view.scaleNote),
        ...(view.horizontalMmPerFt > 0
          ? scaleBar({ view, right: { x: cell.right - 4, y: cell.top + 4 }, roomMm: 27 })
          : []),
        ...clipToView(view, shapes),
      ]),
      ...sheetFrame(model, title, [
        'earth',
        'fill',
        'fabric',
        'surface',
        'base',
        'finished',
        'existing',
        'water',
      ]),
    ],
    words: detailWords(model),
    table: { columns: ['Detail', 'Figure'], rows: detailRows(model) },
  }
}

function quarters(): Box[] {
  const width = (sheetRoom.right - sheetRoom.left - GAP_MM) / 2
  const height = (sheetRoom.bottom - sheetRoom.top - GAP_MM) / 2
  return [0, 1, 2, 3].map((index) => {
    const left = sheetRoom.left + (index % 2) * (width + GAP_MM)
    const top = sheetRoom.top + Math.floor(index / 2) * (height + GAP_MM)
    return { left, top, right: left + width, bottom: top + height }
  })
}

function detailAt(model: SheetModel, index: number, clip: Box): Detail | null {
  if (index === 0) {
    const view = edgeDetailView(model, clip)
    return { view, shapes: edgeDetail(model, view) }
  }
  if (index === 1 && model.berm) {
    const view = bermDetailView(model.berm, clip)
    return { view, shapes: bermDetail(model.berm, view) }
  }
  if (index < 2 || !model.fabric) return null
  const view =
    index === 2
      ? sketchView('laps', 'Laps of the fabric', clip)
      : sketchView('ends', 'Ends of the fabric', clip)
  return { view, shapes: index === 2 ? lapDetail(model.fabric, view) : endsDetail(model, model.fabric, view) }
}

function detailRows(model: SheetModel): string[][] {
  const { fabric, berm } = model
  return [
    ...model.layers.map((layer) => [
      layer.name,
      `${numberText(layer.stoneSizeIn)} in stone, ${numberText(layer.thicknessIn)} in thick`,
    ]),
    ...(fabric
      ? [
          ['Fabric lap above water', feetAndInches(fabric.plan.lapDryFt)],
          ['Fabric lap under water', feetAndInches(fabric.plan.lapWetFt)],
          ['Fabric at the toe', `wrapped back ${feetAndInches(fabric.plan.toeWrapFt)}`],
          ['Fabric at the edges', `turned up ${feetAndInches(fabric.plan.sideTurnUpFt)}`],
        ]
      : []),
    ...(berm
      ? [
          [
            'Berm height',
            `${feetAndInches(berm.value.builtHeightFt, 2)} built, ${feetAndInches(berm.value.settledHeightFt, 2)} settled`,
          ],
          ['Berm top', `${feetAndInches(berm.plan.topWidthFt)} wide`],
        ]
      : []),
  ]
}

const detailWords = (model: SheetModel): string[] =>
  detailRows(model).map(([name, figure]) => `${name}: ${figure}.`)
