import {
  designInput,
  type DesignInput,
  type DesignPlan,
  type GroundLinePoint,
  type ResolvedWith,
} from 'shared'
import { fundingOffers, type FundingOffer } from './funding-offers.js'
import { missingRules } from './missing-rules.js'
import type { RulesInForce } from './rules-in-force.js'

export interface ResolveDesignInput {
  plan: DesignPlan
  /** From the survey of the job; empty while there is none. */
  groundLine: readonly GroundLinePoint[]
  rules: RulesInForce
}

export interface ResolvedDesignInput {
  input: DesignInput
  resolvedWith: ResolvedWith
  offers: FundingOffer[]
}

/** Joins what the planner chose with the rules and prices in force, and says which they were. */
export function resolveDesignInput({ plan, groundLine, rules }: ResolveDesignInput): ResolvedDesignInput {
  const { criteriaSet, costList, settings } = rules
  const offers = fundingOffers(plan, rules)
  const input = designInput({
    plan,
    groundLine: [...groundLine],
    costList: costList && { name: costList.name, lines: costList.lines },
    sources: offers.flatMap(({ source }) => source ?? []),
    criteria: criteriaSet?.criteria ?? [],
    settings: settings.map(({ key, value, source }) => ({ key, value, source })),
  })
  const resolvedWith: ResolvedWith = {
    criteriaSet: criteriaSet && { id: criteriaSet.id, name: criteriaSet.name },
    costList: costList && { id: costList.id, name: costList.name },
    schedules: offers.flatMap(({ schedule }) =>
      schedule ? [{ id: schedule.id, key: schedule.key, name: schedule.name }] : [],
    ),
    missing: missingRules(rules, offers),
  }
  return { input, resolvedWith, offers }
}
