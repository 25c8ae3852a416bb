import type { GridColumn, GridRow } from './grid-columns'
import { emptyRow } from './grid-rows'

export interface CellPlace {
  row: number
  column: number
}

interface PasteBlockInput {
  columns: readonly GridColumn[]
  rows: readonly GridRow[]
  at: CellPlace
  text: string
}

/** More than one cell: a spreadsheet puts tabs between cells and line ends between rows. */
export const isBlock = (text: string): boolean => /[\t\n]/.test(text.replace(/[\r\n]+$/, ''))

/** Lays a block copied from a spreadsheet over the cells right of and below a place; rows are added as needed. */
export function pasteBlock({ columns, rows, at, text }: PasteBlockInput): GridRow[] {
  const block = text
    .replace(/\r\n?/g, '\n')
    .replace(/\n+$/, '')
    .split('\n')
    .map((line) => line.split('\t'))
  const pasted = [...rows]
  block.forEach((cells, down) => {
    const row = { ...(pasted[at.row + down] ?? emptyRow(columns)) }
    cells.forEach((cell, right) => {
      const column = columns[at.column + right]
      if (column) row[column.key] = cell.trim()
    })
    pasted[at.row + down] = row
  })
  return pasted
}
