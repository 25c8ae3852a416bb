import { polyline, textAt, textWidthMm } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block } from './block.js'
import { layLines } from './lay-lines.js'
import { node, type Piece } from './piece.js'

type Figures = Extract<Block, { kind: 'figures' }>

const IN_A_ROW = 3
const HEIGHT_MM = 17
const GAP_MM = 8

/** The deciding figures, large, three in a row: number, its unit lighter after it, its name below. */
export function layFigures({ figures }: Figures, widthMm: number): Piece[] {
  const columnMm = (widthMm - GAP_MM * (IN_A_ROW - 1)) / IN_A_ROW
  const rows = Array.from({ length: Math.ceil(figures.length / IN_A_ROW) }, (_, row) =>
    figures.slice(row * IN_A_ROW, (row + 1) * IN_A_ROW),
  )
  return rows.map((row, index): Piece => ({
    heightMm: HEIGHT_MM,
    gapBeforeMm: index === 0 ? gaps.block : 1.5,
    node: node('Div', {
      children: row.map((figure, place) => figureNode(figure, place * (columnMm + GAP_MM), columnMm)),
    }),
    art: row.map((_, place) => {
      const x = place * (columnMm + GAP_MM)
      return polyline(
        [
          { x, y: 0 },
          { x: x + columnMm, y: 0 },
        ],
        { tone: 'ink', widthMm: 0.35 },
      )
    }),
  }))
}

function figureNode(figure: Figures['figures'][number], xMm: number, widthMm: number) {
  const { sizeMm } = type.figure
  const value = textAt(figure.value, { x: xMm, y: 8.2 }, { sizeMm, weight: 'bold' })
  const unit = figure.unit
    ? [
        textAt(
          figure.unit,
          { x: xMm + textWidthMm(value) + 1.4, y: 8.2 },
          { sizeMm: type.text.sizeMm, tone: 'mute' },
        ),
      ]
    : []
  const name = layLines({ text: figure.name, xMm, widthMm, yMm: 9.6, style: { ...type.small, tone: 'mute' } })
  return node('P', { texts: [...name, value, ...unit] })
}
