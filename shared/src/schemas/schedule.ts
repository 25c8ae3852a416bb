import { z } from 'zod'
import type { VersionedStatus } from './criteria.js'
import { civilDateSchema, lineOfText, moneySchema, numberBetween, rateSchema } from './primitives.js'

export const sourceKinds = ['unit-rate', 'percent-of-cost', 'fixed'] as const

/** As many as a file may have, too. */
export const mostScheduleLines = 2000

export const scheduleLineSchema = z.strictObject({
  code: lineOfText(40),
  practice: z.string().regex(/^\d{3}$/, 'A practice has a number of three digits'),
  title: lineOfText(160),
  unit: lineOfText(20),
  /** Unit rate: dollars paid a unit. Percent of cost: the area's average cost of a unit. */
  baseRate: rateSchema,
  higherRate: rateSchema.optional(),
  /** The line of our bill of quantities that this line pays; null while nobody has mapped it. */
  quantityKey: lineOfText(60).nullable(),
})

export const scheduleInputSchema = z.strictObject({
  key: z.string().regex(/^[a-z0-9-]{2,60}$/, 'Use small letters, digits and hyphens'),
  name: lineOfText(120),
  fiscalYear: z.number().int().min(2000).max(2100),
  kind: z.enum(sourceKinds),
  effectiveFrom: civilDateSchema,
  effectiveTo: civilDateSchema,
  percent: numberBetween(0, 100, 'percent').optional(),
  higherPercent: numberBetween(0, 100, 'percent').optional(),
  percentOf: z.enum(['estimated-cost', 'cost-after-earlier-sources']).optional(),
  cap: moneySchema.optional(),
  amount: moneySchema.optional(),
  advancePercent: numberBetween(0, 100, 'percent').optional(),
  practices: z
    .array(z.string().regex(/^\d{3}$/))
    .max(30)
    .optional(),
  lines: z.array(scheduleLineSchema).max(mostScheduleLines),
})

export const mapScheduleLinesSchema = z.strictObject({
  mapping: z
    .array(z.strictObject({ code: lineOfText(40), quantityKey: lineOfText(60).nullable() }))
    .min(1)
    .max(mostScheduleLines),
})

export type ScheduleLine = z.infer<typeof scheduleLineSchema>
export type ScheduleInput = z.infer<typeof scheduleInputSchema>

export interface ScheduleView extends ScheduleInput {
  id: string
  status: VersionedStatus
  version: number
}
export interface ScheduleListItem {
  id: string
  key: string
  name: string
  fiscalYear: number
  kind: ScheduleInput['kind']
  status: VersionedStatus
  effectiveFrom: string
  effectiveTo: string
  lines: number
  unmappedLines: number
}
