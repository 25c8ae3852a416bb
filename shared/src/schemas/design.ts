import { z } from 'zod'
import type { DesignResult } from '../engineering/design/design-result.js'
import { designPlanSchema, type DesignPlan } from './design-plan.js'
import type { SurveyInput } from './level-notes.js'
import { lineOfText } from './primitives.js'

export const designInputSchema = z.strictObject({ name: lineOfText(80), plan: designPlanSchema })

export interface SurveyView {
  version: number
  survey: SurveyInput
  /** Reduced from the notes, or as typed. */
  groundLine: { stationFt: number; elevationFt: number }[]
  reduction: SurveyReduction | null
  /** What the notes leave open, such as a misclosure, in whole sentences. */
  remarks?: string[]
}

export interface SurveyReduction {
  points: { label: string; stationFt?: number; elevationFt: number; instrumentHeightFt: number }[]
  sumBacksightFt: number
  sumForesightFt: number
  differenceFt: number
  arithmeticCheckPasses: boolean
  misclosureFt?: number
  allowableFt?: number
  closes?: boolean
}

/** Which rules and prices a result was worked out with. */
export interface ResolvedWith {
  criteriaSet: { id: string; name: string } | null
  costList: { id: string; name: string } | null
  schedules: { id: string; key: string; name: string }[]
  missing: string[]
}

export interface DesignView {
  id: string
  jobId: string
  name: string
  version: number
  isChosen: boolean
  plan: DesignPlan
  result: DesignResult
  resolvedWith: ResolvedWith
  updatedAt: string
  designerName: string
}
