import { EngineeringInputError, sourceFromSchedule, type DesignPlan, type FundingSource } from 'shared'
import type { RulesInForce } from './rules-in-force.js'
import type { ScheduleInForce } from './schedule-in-force.js'

type FundingChoice = NonNullable<DesignPlan['funding']>['sources'][number]

/** A fund the plan names: its terms as they are in force, or the sentence that says why it cannot pay. */
export interface FundingOffer {
  choice: FundingChoice
  schedule: ScheduleInForce | null
  source: FundingSource | null
  trouble: string | null
}

/** In the order of the plan. A fund in trouble pays nothing, and takes nothing else of the design with it. */
export function fundingOffers(plan: DesignPlan, rules: RulesInForce): FundingOffer[] {
  return (plan.funding?.sources ?? []).map((choice) => {
    const schedule = rules.schedules.find(({ key }) => key === choice.scheduleKey) ?? null
    if (schedule === null) {
      const trouble = `No payment schedule "${choice.scheduleKey}" is in force on ${rules.onDate}. The office puts one in force under Schedules.`
      return { choice, schedule, source: null, trouble }
    }
    return { choice, schedule, ...sourceOrTrouble(schedule, choice) }
  })
}

function sourceOrTrouble(
  schedule: ScheduleInForce,
  choice: FundingChoice,
): Pick<FundingOffer, 'source' | 'trouble'> {
  try {
    return { source: sourceFromSchedule({ schedule, choice }), trouble: null }
  } catch (error) {
    if (error instanceof EngineeringInputError) return { source: null, trouble: error.message }
    throw error
  }
}
