import type { ScheduleInput } from 'shared'

export const kindWords: Record<ScheduleInput['kind'], string> = {
  'unit-rate': 'a rate for each unit',
  'percent-of-cost': 'a percent of the cost',
  fixed: 'a fixed amount',
}

export const percentOfWords: Record<NonNullable<ScheduleInput['percentOf']>, string> = {
  'estimated-cost': 'the estimated cost',
  'cost-after-earlier-sources': 'what is left after the funds before it',
}
