import type { GridColumn, GridRow } from './grid-columns'

export const emptyRow = (columns: readonly GridColumn[]): GridRow =>
  Object.fromEntries(columns.map(({ key }) => [key, '']))

const isBlank = (row: GridRow): boolean => Object.values(row).every((cell) => cell.trim() === '')

/** Rows as they will be sent. Blank rows at the end are room for typing; one in between keeps its number. */
export function readRows(
  columns: readonly GridColumn[],
  rows: readonly GridRow[],
): Record<string, unknown>[] {
  const last = rows.findLastIndex((row) => !isBlank(row))
  return rows.slice(0, last + 1).map((row) =>
    Object.fromEntries(
      columns.flatMap(({ key, read }) => {
        const typed = row[key]?.trim() ?? ''
        return typed === '' ? [] : [[key, read(typed)]]
      }),
    ),
  )
}

export const writeRows = (
  columns: readonly GridColumn[],
  values: readonly Readonly<Record<string, unknown>>[],
): GridRow[] =>
  values.map((value) => Object.fromEntries(columns.map(({ key, write }) => [key, write(value[key])])))

/** Always one blank row to type on, and never an empty grid. */
export const withRoom = (columns: readonly GridColumn[], rows: readonly GridRow[]): GridRow[] =>
  rows.length > 0 && isBlank(rows.at(-1) as GridRow) ? [...rows] : [...rows, emptyRow(columns)]
