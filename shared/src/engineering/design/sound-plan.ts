import { designPlanSchema } from '../../schemas/design-plan.js'
import type { DesignInput } from './design-input.js'
import { missingPlanSentences, type PlanPart } from './missing-plan-sentences.js'
import type { PartFailed } from './part-result.js'

export type PlanFaults = { readonly [Part in PlanPart]?: PartFailed }

export interface SoundPlan {
  /** The input without the parts that are half typed. */
  sound: DesignInput
  faults: PlanFaults
}

const planParts = Object.keys(missingPlanSentences) as PlanPart[]

/**
 * Keeps half-typed parts from the formulas, so that they may trust the shape of what they get. The first fault of each
 * such part stays, for the place where it was typed.
 */
export function soundPlan(input: DesignInput): SoundPlan {
  const sound = { ...input }
  const faults: { [Part in PlanPart]?: PartFailed } = {}
  for (const part of planParts) {
    // A part that a form has emptied is one that nobody has planned.
    if (input[part] === undefined || input[part] === null) {
      delete sound[part]
      continue
    }
    const fault = faultOf(part, input)
    if (!fault) continue
    faults[part] = fault
    delete sound[part]
  }
  return { sound, faults }
}

function faultOf(part: PlanPart, input: DesignInput): PartFailed | undefined {
  const [issue] = designPlanSchema.shape[part].safeParse(typed(part, input)).error?.issues ?? []
  if (!issue) return undefined
  return { ok: false, field: fieldOf(part, issue.path), message: sentenceOf(issue.message) }
}

/** The ground line is joined to the site from the survey and is judged there. */
function typed(part: PlanPart, input: DesignInput): unknown {
  if (part !== 'site' || typeof input.site !== 'object') return input[part]
  const typedSite: Partial<DesignInput['site']> = { ...input.site }
  delete typedSite.groundLine
  return typedSite
}

const fieldOf = (part: PlanPart, path: readonly PropertyKey[]): string =>
  path.reduce<string>(
    (field, step) => (typeof step === 'number' ? `${field}[${step}]` : `${field}.${String(step)}`),
    part,
  )

/** The schema has its own sentence for every figure; what is left is a field that is not there or not of its kind. */
const sentenceOf = (message: string): string =>
  message.startsWith('Invalid ') ? 'This is still empty or not of the right kind.' : `${message}.`
