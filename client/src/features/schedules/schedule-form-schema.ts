import { scheduleInputSchema, type ScheduleInput } from 'shared'
import type { z } from 'zod'
import { readSchema } from '../../components/fields/read-schema'
import { withoutEmpty } from '../../components/fields/without-empty'

/** What only some kinds of fund have. */
const kindTerms = ['percent', 'higherPercent', 'percentOf', 'amount', 'lines'] as const
export type Term = (typeof kindTerms)[number]

const termsOf: Record<ScheduleInput['kind'], readonly Term[]> = {
  'unit-rate': ['lines'],
  'percent-of-cost': ['percent', 'higherPercent', 'percentOf', 'lines'],
  fixed: ['amount'],
}

export const hasTerm = (kind: ScheduleInput['kind'], term: Term): boolean => termsOf[kind].includes(term)

type ScheduleFields = z.input<typeof scheduleInputSchema>

/** What was typed for another kind of fund stays in its boxes, and is not sent; nor is a box that was emptied. */
export const scheduleFormSchema = readSchema(scheduleInputSchema, (typed: ScheduleFields) => {
  const foreign = kindTerms.filter((term) => !hasTerm(typed.kind, term))
  const kept = Object.entries(typed).filter(([name]) => !foreign.some((term) => term === name))
  // A line that pays for nothing of ours says so: that null is no emptied box.
  const lines = typed.lines.map((line) => ({
    ...(withoutEmpty(line) as typeof line),
    quantityKey: line.quantityKey,
  }))
  const terms = withoutEmpty(Object.fromEntries(kept)) as Partial<ScheduleFields>
  return { ...terms, lines: hasTerm(typed.kind, 'lines') ? lines : [] }
})
