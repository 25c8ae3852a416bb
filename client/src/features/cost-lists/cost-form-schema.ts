import { costListInputSchema, quantityKeys, type CostListInput, type CostListView } from 'shared'
import { z } from 'zod'
import { plainIssues } from '../../components/fields/plain-issues'

/** A row of the form: every quantity stands there, priced or not. */
interface CostRow {
  key: string
  /** Null when it was emptied. */
  low?: string | null
  typical?: string | null
  high?: string | null
}

export interface CostFields extends Omit<CostListInput, 'lines'> {
  lines: CostRow[]
}

const isPriced = ({ low, typical, high }: CostRow): boolean =>
  [low, typical, high].some((price) => (price ?? null) !== null)

/** Rows without any price are left out; one that is priced in part is not right yet. */
export const costFormSchema = z.custom<CostFields>().transform((typed, context): CostListInput => {
  const places = typed.lines.flatMap((row, place) => (isPriced(row) ? [place] : []))
  const read = costListInputSchema.safeParse({ ...typed, lines: typed.lines.filter(isPriced) })
  if (read.success) return read.data
  for (const { path, message } of plainIssues(read.error.issues)) {
    const [field, line, ...rest] = path
    const place = field === 'lines' ? places[Number(line)] : undefined
    context.addIssue({
      code: 'custom',
      path: place === undefined ? path : ['lines', place, ...rest],
      message,
    })
  }
  return z.NEVER
})

/** Every quantity, with the prices of the list in force where it has them. */
export const rowsFrom = (inForce: CostListView | undefined): CostRow[] =>
  quantityKeys.map((key) => {
    const line = inForce?.lines.find((one) => one.key === key)
    return { key, low: line?.low, typical: line?.typical, high: line?.high }
  })
