import type { Money } from '../schemas/primitives.js'
import { Exact, exactSum, type ExactNumber } from './exact.js'
import { halfUpToCents } from './half-up-to-cents.js'
import { requireDecimal } from './require-decimal.js'

export const noMoney = '0.00' as Money

const exact = (amount: Money): ExactNumber => new Exact(amount)

/** Money from text such as "72.59" or "72.5". @throws EngineeringInputError */
export const money = (text: string): Money => halfUpToCents(requireDecimal({ field: 'amount', value: text }))

export const addMoney = (...amounts: readonly Money[]): Money => halfUpToCents(exactSum(amounts.map(exact)))

/** What is left of `from`. @throws RangeError when more is taken than there is. */
export const subtractMoney = (from: Money, taken: Money): Money =>
  halfUpToCents(exact(from).minus(exact(taken)))

export const leastMoney = (first: Money, ...others: readonly Money[]): Money =>
  others.reduce((least, amount) => (exact(amount).lessThan(exact(least)) ? amount : least), first)

/** Below 0, 0 or above 0 as `a` is less than, the same as or more than `b`. */
export const compareMoney = (a: Money, b: Money): number => exact(a).comparedTo(exact(b))

/** Quantity times dollars a unit, rounded once. */
export const priceOf = (quantity: number, rate: string): Money =>
  halfUpToCents(new Exact(quantity).times(requireDecimal({ field: 'rate', value: rate })))

export const percentOfMoney = (amount: Money, percent: number): Money =>
  halfUpToCents(exact(amount).times(percent).dividedBy(100))
