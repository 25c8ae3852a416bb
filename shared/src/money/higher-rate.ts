import { requireNumber } from '../engineering/require-number.js'
import type { Money } from '../schemas/primitives.js'
import { halfUpToCents } from './half-up-to-cents.js'
import { requireDecimal } from './require-decimal.js'

export interface HigherRateInput {
  baseRate: string
  basePercent: number
  higherPercent: number
}

/** The rate of a higher percent of the same cost: base rate / base percent · higher percent. */
export function higherRate({ baseRate, basePercent, higherPercent }: HigherRateInput): Money {
  const base = requireNumber({ field: 'basePercent', value: basePercent, exclusiveMin: 0, max: 100 })
  const higher = requireNumber({ field: 'higherPercent', value: higherPercent, min: 0, max: 100 })
  return halfUpToCents(requireDecimal({ field: 'baseRate', value: baseRate }).times(higher).dividedBy(base))
}
