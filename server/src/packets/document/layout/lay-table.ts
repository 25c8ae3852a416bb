import { polyline, type Shape, type TextShape, type Tone } from 'shared'
import { gaps, type } from '../theme.js'
import type { Block, TableColumn, TableRow } from './block.js'
import { layLines, linesHeight, type LineStyle } from './lay-lines.js'
import { node, type Piece } from './piece.js'

type Table = Extract<Block, { kind: 'table' }>

const COLUMN_GAP_MM = 3.5
const SHORT_ROWS = 6

interface Column extends TableColumn {
  xMm: number
  widthMm: number
}

/** A table ruled like a field book: a hairline under each row, a double rule over a sum. */
export function layTable(table: Table, widthMm: number, id: string): Piece[] {
  const columns = columnsOf(table.columns, widthMm)
  const head = headPiece(columns, widthMm)
  const group = { id, tag: 'Table' as const, head }
  const rows = table.rows.map((row): Piece => ({ ...rowPiece(row, columns, widthMm), group }))
  const first = { ...head, gapBeforeMm: gaps.block, keepWithNext: true, group }
  // A short table reads badly in two halves, so all its rows but the last hold on to the next.
  const isShort = rows.length <= SHORT_ROWS
  return [
    first,
    ...rows.map((row, index) => (isShort && index < rows.length - 1 ? { ...row, keepWithNext: true } : row)),
  ]
}

function columnsOf(columns: readonly TableColumn[], widthMm: number): Column[] {
  const total = columns.reduce((sum, column) => sum + column.share, 0)
  const room = widthMm - COLUMN_GAP_MM * (columns.length - 1)
  let xMm = 0
  return columns.map((column) => {
    const laid = { ...column, xMm, widthMm: (room * column.share) / total }
    xMm += laid.widthMm + COLUMN_GAP_MM
    return laid
  })
}

const rule = (yMm: number, widthMm: number, tone: Tone, thickMm: number): Shape =>
  polyline(
    [
      { x: 0, y: yMm },
      { x: widthMm, y: yMm },
    ],
    { tone, widthMm: thickMm },
  )

function headPiece(columns: readonly Column[], widthMm: number): Piece {
  const style: LineStyle = { ...type.small, tone: 'mute' }
  const cells = columns.map((column) =>
    layLines({
      text: column.title,
      xMm: column.xMm,
      widthMm: column.widthMm,
      style: { ...style, align: column.align ?? 'left' },
    }),
  )
  const heightMm = Math.max(...cells.map((texts) => linesHeight(texts, style))) + gaps.row
  const atFoot = cells.map((texts) => lowered(texts, heightMm - gaps.row - linesHeight(texts, style)))
  return {
    heightMm,
    gapBeforeMm: 0,
    node: node('TR', { children: atFoot.map((texts) => node('TH', { texts, scope: 'Column' })) }),
    art: [rule(heightMm, widthMm, 'ink', 0.5)],
  }
}

const lowered = (texts: readonly TextShape[], byMm: number) =>
  texts.map((text) => ({ ...text, at: { x: text.at.x, y: text.at.y + byMm } }))

function rowPiece(row: TableRow, columns: readonly Column[], widthMm: number): Piece {
  const isBold = row.kind === 'sum' || row.kind === 'part'
  const style: LineStyle = { ...type.small, weight: isBold ? 'bold' : 'regular' }
  const cells = columns.map((column, index) => {
    const isWide = row.kind === 'part' && index === 0
    return layLines({
      text: row.cells[index] ?? '',
      xMm: column.xMm,
      widthMm: isWide ? widthMm : column.widthMm,
      yMm: gaps.row,
      style: { ...style, align: column.align ?? 'left' },
    })
  })
  const heightMm = Math.max(...cells.map((texts) => linesHeight(texts, style))) + gaps.row * 2
  const sumRules = [rule(0.1, widthMm, 'ink', 0.25), rule(0.8, widthMm, 'ink', 0.25)]
  return {
    heightMm,
    gapBeforeMm: row.kind === 'part' ? gaps.block : 0,
    node: node('TR', { children: cells.map((texts) => node('TD', { texts })) }),
    art: [...(row.kind === 'sum' ? sumRules : []), rule(heightMm, widthMm, 'hairline', 0.25)],
    ...(row.kind === 'part' ? { keepWithNext: true } : {}),
  }
}
