import type { FundingSource } from '../../money/funding/funding-source.js'
import type { CostLine } from '../../schemas/cost-list.js'
import type { Criterion } from '../../schemas/criteria.js'
import type { DesignPlan } from '../../schemas/design-plan.js'

export interface GroundLinePoint {
  stationFt: number
  elevationFt: number
}

/** A district setting as the design sees it; null means: nobody has entered it yet. */
export interface DesignSetting {
  key: string
  value: number | null
  source: string
}

export type DesignSite = NonNullable<DesignPlan['site']> & {
  /** From the survey of the job; empty while there is none. */
  groundLine: GroundLinePoint[]
}

/** All that a design follows from, resolved and frozen: no id is looked up while it is worked out. */
export interface DesignInput extends Omit<DesignPlan, 'site' | 'funding'> {
  site?: DesignSite
  /** Null while no cost list is in force. */
  costList: { name: string; lines: CostLine[] } | null
  /** In the order in which they pay. */
  sources: FundingSource[]
  criteria: Criterion[]
  settings: DesignSetting[]
  /** Whether all funds together are held against the whole job or against every practice. Left out: job. */
  stackScope?: 'job' | 'practice'
}

export interface DesignInputParts {
  plan: DesignPlan
  groundLine: GroundLinePoint[]
  costList: DesignInput['costList']
  sources: FundingSource[]
  criteria: Criterion[]
  settings: DesignSetting[]
  stackScope?: DesignInput['stackScope']
}

/** Joins what the planner chose with what the survey and the district give. */
export function designInput({ plan, groundLine, ...rest }: DesignInputParts): DesignInput {
  const parts: Omit<DesignPlan, 'site'> = { ...plan }
  // What the plan says of funding has become `sources`; its site is joined with the ground line.
  delete parts.funding
  const site = plan.site && { ...plan.site, groundLine }
  return { ...parts, ...(site ? { site } : {}), ...rest }
}
