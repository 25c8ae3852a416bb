import { EngineeringInputError } from '../../engineering/engineering-input-error.js'
import type { FundingPlan } from '../../schemas/funding-plan.js'
import type { ScheduleInput } from '../../schemas/schedule.js'
import type { FundingSource } from './funding-source.js'

export interface SourceFromScheduleInput {
  schedule: ScheduleInput
  /** What the planner chose of it. */
  choice: FundingPlan['sources'][number]
}

/**
 * Turns a schedule in force and the planner's choice into a source of the stack. The higher rate is taken where the
 * choice asks for it and the schedule has one.
 *
 * @throws EngineeringInputError when two lines of the schedule pay the same line of quantities.
 */
export function sourceFromSchedule({ schedule, choice }: SourceFromScheduleInput): FundingSource {
  const rates = ratesByKey({ schedule, choice })
  const { key, name, kind, practices, percentOf, cap, amount, advancePercent } = schedule
  const percent = choice.rate === 'higher' ? (schedule.higherPercent ?? schedule.percent) : schedule.percent
  return defined({
    key,
    name,
    kind,
    practices,
    percentOf,
    cap,
    amount,
    advancePercent,
    personLimitRemaining: choice.personLimitRemaining,
    ...(kind === 'unit-rate'
      ? {
          lines: [...rates].map(([line, rate]) =>
            defined({ key: line, rate, contractedQuantity: choice.contracted?.[line] }),
          ),
        }
      : {}),
    ...(kind === 'percent-of-cost' ? { percent, averageUnitCosts: Object.fromEntries(rates) } : {}),
  })
}

function ratesByKey({ schedule, choice }: SourceFromScheduleInput): Map<string, string> {
  const rates = new Map<string, string>()
  for (const { quantityKey, baseRate, higherRate } of schedule.lines) {
    if (quantityKey === null) continue
    if (rates.has(quantityKey)) {
      const message = `Two lines of ${schedule.name} pay for ${quantityKey}. The office must map only one of them.`
      throw new EngineeringInputError({ field: `sources.${schedule.key}`, message })
    }
    // The average cost behind a percent is the same for everyone; only a unit rate has a higher one.
    const takesHigher = choice.rate === 'higher' && schedule.kind === 'unit-rate'
    rates.set(quantityKey, takesHigher ? (higherRate ?? baseRate) : baseRate)
  }
  return rates
}

/** Leaves out what is undefined, so that a stored input reads the same when it comes back. */
function defined<Value extends object>(value: Value): Value {
  return Object.fromEntries(Object.entries(value).filter(([, entry]) => entry !== undefined)) as Value
}
