import { designPlanSchema, type DesignPart, type DesignPlan } from 'shared'
import { z } from 'zod'
import { plainIssues } from '../../components/fields/plain-issues'
import { readPart, savablePlan, type PlanDraft, type Savable } from './plan-draft'

/** The part on the page must be right to be saved; what is unfinished elsewhere waits. */
export const planFormSchema = (part: DesignPart, stored: DesignPlan) =>
  z.custom<PlanDraft>().transform((draft, context): Savable => {
    const parsed = designPlanSchema.shape[part].safeParse(readPart(part, draft[part]))
    if (!parsed.success) {
      for (const { path, message } of plainIssues(parsed.error.issues, [part])) {
        context.addIssue({ code: 'custom', path, message })
      }
      return z.NEVER
    }
    return savablePlan(draft, stored)
  })
