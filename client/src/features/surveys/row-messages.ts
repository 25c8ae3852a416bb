import type { GridColumn } from './grid-columns'

const isBranch = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null

const messageOf = (value: unknown): string | undefined =>
  isBranch(value) && typeof value.message === 'string' ? value.message : undefined

/** What the form says of one row and of each of its cells. */
export function rowMessages(errors: unknown, columns: readonly GridColumn[]) {
  const cellMessages = new Map<string, string>()
  if (!isBranch(errors)) return { rowMessage: undefined, cellMessages }
  for (const { key } of columns) {
    const message = messageOf(errors[key])
    if (message !== undefined) cellMessages.set(key, message)
  }
  return { rowMessage: messageOf(errors) ?? messageOf(errors.root), cellMessages }
}

/** What the form says of the row at a place. */
export const errorsOfRow = (errors: unknown, index: number): unknown =>
  isBranch(errors) ? errors[String(index)] : undefined
