import type { Money } from '../schemas/primitives.js'
import { Exact, exactSum, type ExactNumber } from './exact.js'
import { halfUpToCents } from './half-up-to-cents.js'

/**
 * Splits an amount in proportion to weights so that the parts sum to the whole: every part gets its whole cents,
 * and the cents left over go to the largest remainders, the earlier part first where they are equal.
 *
 * @throws RangeError when there is something to split and no weight above 0.
 */
export function allocateMoney(total: Money, weights: readonly ExactNumber[]): Money[] {
  const weight = exactSum(weights)
  const cents = new Exact(total).times(100)
  if (weight.isZero()) {
    if (!cents.isZero()) throw new RangeError('No weight to split the amount by')
    return weights.map(() => halfUpToCents(new Exact(0)))
  }
  const shares = weights.map((part) => cents.times(part).dividedBy(weight))
  const whole = shares.map((share) => share.floor())
  const left = cents.minus(exactSum(whole)).toNumber()
  const byRemainder = shares
    .map((share, index) => ({ index, remainder: share.minus(share.floor()) }))
    .sort((a, b) => b.remainder.comparedTo(a.remainder) || a.index - b.index)
  const luckier = new Set(byRemainder.slice(0, left).map(({ index }) => index))
  return whole.map((part, index) => halfUpToCents(part.plus(luckier.has(index) ? 1 : 0).dividedBy(100)))
}
