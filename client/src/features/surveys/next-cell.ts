import type { CellPlace } from './paste-block'

interface KeyInCell {
  key: string
  shiftKey: boolean
  /** The caret stands before the first or after the last letter, so that an arrow would not move in the text. */
  isAtStart: boolean
  isAtEnd: boolean
}

/** Where a key leads from a cell, as in a spreadsheet; null leaves the key to the text box. */
export function nextCell(from: CellPlace, pressed: KeyInCell): CellPlace | null {
  const { key, shiftKey } = pressed
  if (key === 'ArrowDown' || (key === 'Enter' && !shiftKey)) return { ...from, row: from.row + 1 }
  if (key === 'ArrowUp' || key === 'Enter') return { ...from, row: from.row - 1 }
  if (key === 'ArrowLeft' && pressed.isAtStart) return { ...from, column: from.column - 1 }
  if (key === 'ArrowRight' && pressed.isAtEnd) return { ...from, column: from.column + 1 }
  return null
}
