import { z } from 'zod'
import { lineOfText, moneySchema, numberBetween } from './primitives.js'

/** Which funds pay for a design, in order. The server resolves each key to the schedule in force. */
export const fundingPlanSchema = z.strictObject({
  sources: z
    .array(
      z.strictObject({
        scheduleKey: lineOfText(60),
        rate: z.enum(['base', 'higher']),
        personLimitRemaining: moneySchema.optional(),
        contracted: z.record(z.string().min(1).max(60), numberBetween(0, 1e9, '')).optional(),
      }),
    )
    .max(8),
})
export type FundingPlan = z.infer<typeof fundingPlanSchema>
