import { z } from 'zod'
import { civilDateSchema, lineOfText, lineOrEmpty, numberBetween, paragraph } from './primitives.js'

const limitFigure = numberBetween(-1e9, 1e9, '')

export const criterionSchema = z.strictObject({
  id: z.string().regex(/^[a-z0-9-]{2,60}$/),
  practice: z.string().regex(/^\d{3}$/),
  title: lineOfText(120),
  comparison: z.enum(['at-least', 'at-most', 'between', 'yes']),
  /** The limit: a number, a pair for `between`, or the key of a district setting. */
  limit: z
    .union([limitFigure, z.tuple([limitFigure, limitFigure]), z.strictObject({ setting: lineOfText(60) })])
    .nullable(),
  unit: lineOrEmpty(40),
  whenMissed: z.enum(['fail', 'caution', 'note']),
  source: lineOfText(300),
  confidence: z.enum(['read', 'memory', 'district-setting', 'common-practice', 'geometry']),
  note: paragraph(600).optional(),
})

export const criteriaSetInputSchema = z.strictObject({
  name: lineOfText(120),
  effectiveFrom: civilDateSchema,
  criteria: z.array(criterionSchema).min(1).max(200),
})

export type Criterion = z.infer<typeof criterionSchema>
export type CriteriaSetInput = z.infer<typeof criteriaSetInputSchema>

export interface CriteriaSetView extends CriteriaSetInput {
  id: string
  status: VersionedStatus
  version: number
}

/** Lists and sets are drafts until put in force; then they are never edited, only retired by a newer one. */
export const versionedStatuses = ['draft', 'in-force', 'retired'] as const
export type VersionedStatus = (typeof versionedStatuses)[number]
