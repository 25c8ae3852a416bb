import type { Money } from '../../schemas/primitives.js'
import { allocateMoney } from '../allocate-money.js'
import { exactSum } from '../exact.js'
import { halfUpToCents } from '../half-up-to-cents.js'
import { noMoney } from '../money-arithmetic.js'
import type { FundedLine } from './funding-source.js'
import type { Share } from './stack-state.js'

/**
 * Turns exact shares into cents that sum to what is paid. Cents are given to the practices first and then within
 * each, since a practice held to its limit must not win a cent from another.
 */
export function fundLines(paid: Money, shares: readonly Share[]): FundedLine[] {
  if (shares.every(({ amount }) => amount.decimalPlaces() <= 2)) {
    return shares.map((share) => fundedLine(share, halfUpToCents(share.amount)))
  }
  const practices = [...new Set(shares.map(({ practice }) => practice))]
  const groups = practices.map((practice) => shares.filter((share) => share.practice === practice))
  const perPractice = allocateMoney(
    paid,
    groups.map((group) => exactSum(group.map(({ amount }) => amount))),
  )
  const amounts = new Map<Share, Money>()
  groups.forEach((group, index) => {
    const weights = group.map(({ amount }) => amount)
    const cents = allocateMoney(perPractice[index] ?? noMoney, weights)
    group.forEach((share, place) => amounts.set(share, cents[place] ?? noMoney))
  })
  return shares.map((share) => fundedLine(share, amounts.get(share) ?? noMoney))
}

const fundedLine = ({ key, quantityUsed, rate }: Share, amount: Money): FundedLine => ({
  key,
  quantityUsed,
  ...(rate === undefined ? {} : { rate }),
  amount,
})
