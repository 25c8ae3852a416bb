import { z } from 'zod'
import { lineOfText, moneySchema, numberBetween } from './primitives.js'

const fundingChoiceSchema = z.strictObject({
  scheduleKey: lineOfText(60),
  rate: z.enum(['base', 'higher']),
  personLimitRemaining: moneySchema.optional(),
  contracted: z
    .record(lineOfText(60), numberBetween(0, 1e9, ''))
    .refine((lines) => Object.keys(lines).length <= 200, 'Give at most 200 contracted quantities')
    .optional(),
})

/** Which funds pay for a design, in order. The server resolves each key to the schedule in force. */
export const fundingPlanSchema = z.strictObject({
  sources: z
    .array(fundingChoiceSchema)
    .max(8)
    .superRefine((sources, context) => {
      const keys = sources.map(({ scheduleKey }) => scheduleKey)
      for (const [index, key] of keys.entries()) {
        const first = keys.indexOf(key)
        if (first === index) continue
        const message = `Fund ${first + 1} of this plan is the same; a fund pays once, up to its cap`
        context.addIssue({ code: 'custom', path: [index, 'scheduleKey'], message })
      }
    }),
})
export type FundingPlan = z.infer<typeof fundingPlanSchema>
