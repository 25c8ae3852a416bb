import { quantityKeys, type CostLine } from 'shared'
import { ProblemError } from '../../api/problem-error'

/** The server counts the lines it was sent; the form also holds rows that were left empty. */
export function movedProblem(error: Error | null, sent: readonly CostLine[]): Error | null {
  if (!(error instanceof ProblemError)) return error
  const { slug, status, title, message, fields, reasons, requestId } = error
  const moved = fields.map((field) => ({
    ...field,
    pointer: field.pointer.replace(/^\/lines\/(\d+)/, (all, line) => {
      const place = quantityKeys.findIndex((key) => key === sent[Number(line)]?.key)
      return place < 0 ? all : `/lines/${place}`
    }),
  }))
  return new ProblemError({ slug, status, title, detail: message, fields: moved, reasons, requestId })
}
