import { z } from 'zod'
import type { VersionedStatus } from './criteria.js'
import { civilDateSchema, lineOfText, rateSchema } from './primitives.js'

export const costLineSchema = z.strictObject({
  key: lineOfText(60),
  low: rateSchema,
  typical: rateSchema,
  high: rateSchema,
})

export const costListInputSchema = z.strictObject({
  name: lineOfText(120),
  effectiveFrom: civilDateSchema,
  source: lineOfText(200),
  lines: z.array(costLineSchema).min(1).max(200),
})

export type CostLine = z.infer<typeof costLineSchema>
export type CostListInput = z.infer<typeof costListInputSchema>

export interface CostListView extends CostListInput {
  id: string
  status: VersionedStatus
  version: number
}
