import { useMemo, useState, type ClipboardEvent, type KeyboardEvent } from 'react'
import { useController, useFormContext } from 'react-hook-form'
import { fieldId } from '../../components/fields/field-id'
import type { GridColumn, GridRow } from './grid-columns'
import { emptyRow, withRoom } from './grid-rows'
import { nextCell } from './next-cell'
import { isBlock, pasteBlock, type CellPlace } from './paste-block'

export interface GridActs {
  type: (at: CellPlace, text: string) => void
  press: (at: CellPlace, event: KeyboardEvent<HTMLInputElement>) => void
  paste: (at: CellPlace, event: ClipboardEvent<HTMLInputElement>) => void
  insert: (row: number) => void
  remove: (row: number) => void
}

interface Step {
  rows: readonly GridRow[]
  /** Letters typed one after the other into one cell are one step back. */
  cell: string | null
}

const MOST_STEPS = 50

const pressedIn = (event: KeyboardEvent<HTMLInputElement>) => {
  const { selectionStart, selectionEnd, value } = event.currentTarget
  const isCaret = selectionStart === selectionEnd
  return {
    key: event.key,
    shiftKey: event.shiftKey,
    isAtStart: isCaret && selectionStart === 0,
    isAtEnd: isCaret && selectionEnd === value.length,
  }
}

/** What can be done with the rows of a form, and the way back from the last of it. Rows are read when an act runs. */
export function useGridActs(name: string, columns: readonly GridColumn[]) {
  const { getValues } = useFormContext()
  const { field } = useController({ name })
  const { onChange } = field
  const [past, setPast] = useState<readonly Step[]>([])

  const { change, acts } = useMemo(() => {
    const rows = (): readonly GridRow[] => getValues(name) as readonly GridRow[]
    const change = (next: readonly GridRow[], cell: string | null = null) => {
      const before = rows()
      setPast((steps) =>
        cell !== null && steps.at(-1)?.cell === cell
          ? steps
          : [...steps.slice(1 - MOST_STEPS), { rows: before, cell }],
      )
      onChange(withRoom(columns, next))
    }
    return { change, acts: gridActs({ name, columns, rows, change }) }
  }, [name, columns, getValues, onChange])

  const undo = () => {
    const before = past.at(-1)
    if (before === undefined) return
    setPast(past.slice(0, -1))
    onChange(before.rows)
  }

  return {
    rows: field.value as readonly GridRow[],
    onBlur: field.onBlur,
    acts,
    change,
    undo,
    steps: past.length,
  }
}

interface GridReach {
  name: string
  columns: readonly GridColumn[]
  rows: () => readonly GridRow[]
  change: (next: readonly GridRow[], cell?: string) => void
}

function gridActs({ name, columns, rows, change }: GridReach): GridActs {
  const cellName = ({ row, column }: CellPlace): string => `${name}.${row}.${columns[column]?.key ?? ''}`
  return {
    type: (at, text) => {
      const key = columns[at.column]?.key
      if (key === undefined) return
      const next = rows().map((row, index) => (index === at.row ? { ...row, [key]: text } : row))
      change(next, cellName(at))
    },
    press: (at, event) => {
      const to = nextCell(at, pressedIn(event))
      if (to === null) return
      // Enter must not send the form, and the caret must not jump to the end of the text it leaves.
      event.preventDefault()
      const cell = document.getElementById(fieldId(cellName(to)))
      if (!(cell instanceof HTMLInputElement)) return
      cell.focus()
      cell.select()
    },
    paste: (at, event) => {
      const text = event.clipboardData.getData('text/plain')
      if (!isBlock(text)) return
      event.preventDefault()
      change(pasteBlock({ columns, rows: rows(), at, text }))
    },
    insert: (row) => change(rows().toSpliced(row, 0, emptyRow(columns))),
    remove: (row) => change(rows().toSpliced(row, 1)),
  }
}
