import type { Money } from '../schemas/primitives.js'
import { Exact, type ExactNumber } from './exact.js'

/** The one rule by which an amount becomes money: to the nearest cent, half a cent upward. */
export function halfUpToCents(value: ExactNumber): Money {
  if (value.isNegative() && !value.isZero()) throw new RangeError(`${value.toString()} is no amount of money`)
  return value.abs().toFixed(2, Exact.ROUND_HALF_UP) as Money
}
