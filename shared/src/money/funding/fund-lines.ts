import type { Money } from '../../schemas/primitives.js'
import { allocateMoney } from '../allocate-money.js'
import { exactSum } from '../exact.js'
import type { FundedLine } from './funding-source.js'
import type { Share } from './stack-state.js'

/**
 * Turns exact shares into cents that sum to what is paid. Cents are given to the practices first and then within
 * each, since a practice held to its limit must not win a cent from another.
 */
export function fundLines(paid: Money, shares: readonly Share[]): FundedLine[] {
  const practices = [...new Set(shares.map(({ practice }) => practice))]
  const groups = practices.map((practice) => shares.filter((share) => share.practice === practice))
  const perPractice = allocateMoney(
    paid,
    groups.map((group) => exactSum(group.map(({ amount }) => amount))),
  )
  const amounts = new Map<string, Money>()
  groups.forEach((group, index) => {
    const weights = group.map(({ amount }) => amount)
    const cents = allocateMoney(perPractice[index] ?? ('0.00' as Money), weights)
    group.forEach(({ key }, place) => amounts.set(key, cents[place] ?? ('0.00' as Money)))
  })
  return shares.map(({ key, quantityUsed, rate }) => ({
    key,
    quantityUsed,
    ...(rate === undefined ? {} : { rate }),
    amount: amounts.get(key) ?? ('0.00' as Money),
  }))
}
