import type { Money } from '../../schemas/primitives.js'
import { allocateMoney } from '../allocate-money.js'
import { Exact, exactSum, type ExactNumber } from '../exact.js'
import { halfUpToCents } from '../half-up-to-cents.js'
import { requireDecimal } from '../require-decimal.js'
import { moneyText } from '../../format/money-text.js'
import { noMoney, subtractMoney } from '../money-arithmetic.js'
import type { FundingCut, FundingSource } from './funding-source.js'
import type { PaidSoFar, Share, StackRule } from './stack-state.js'
import type { SourceOffer } from './source-offer.js'

export interface CutOffer {
  paid: Money
  shares: Share[]
  cuts: FundingCut[]
}

interface Step {
  shares: Share[]
  /** What the cut is split between, by weight. */
  reasons: { reason: string; weight: ExactNumber }[]
}

const practicesOf = (shares: readonly Share[]): string[] => [
  ...new Set(shares.map(({ practice }) => practice)),
]

const sumOf = (shares: readonly Share[]): ExactNumber => exactSum(shares.map(({ amount }) => amount))

/**
 * Cuts a source, in this order: its cap, the person's limit, its exclusive group, the stack limit.
 */
export function cutSource(
  source: FundingSource,
  { offered, shares }: SourceOffer,
  paid: PaidSoFar,
  rule: StackRule,
): CutOffer {
  const { key, cap, personLimitRemaining, exclusiveGroup } = source
  const steps: ((open: Share[]) => Step)[] = [
    (open) => downTo(open, cap, `${key}.cap`, 'source cap'),
    (open) => downTo(open, personLimitRemaining, `${key}.personLimitRemaining`, 'person limit'),
    (open) => outsideTheGroup(open, exclusiveGroup, paid),
    (open) => (rule.scope === 'practice' ? insideEachPractice(open, paid, rule) : unchanged(open)),
    (open) => insideTheJob(open, paid, rule),
  ]
  let left = withoutLines({ paid: offered, shares, cuts: [] })
  for (const step of steps) left = applied(left, step(left.shares))
  return left
}

const whole = (reason: string) => ({ reason, weight: new Exact(1) })
const unchanged = (shares: Share[]): Step => ({ shares, reasons: [] })

/** A source with no line to pay on pays nothing, and says so. */
function withoutLines(offer: CutOffer): CutOffer {
  if (offer.shares.length > 0 || offer.paid === noMoney) return offer
  return {
    ...offer,
    paid: noMoney,
    cuts: [{ reason: 'no line of this job is eligible', amount: offer.paid }],
  }
}

function applied(before: CutOffer, { shares, reasons }: Step): CutOffer {
  if (shares === before.shares) return before
  const paid = halfUpToCents(sumOf(shares))
  const cut = subtractMoney(before.paid, paid)
  const amounts = allocateMoney(
    cut,
    reasons.map(({ weight }) => weight),
  )
  const cuts = reasons.flatMap(({ reason }, index) => {
    const amount = amounts[index]
    return amount === undefined || amount === '0.00' ? [] : [{ reason, amount }]
  })
  return { paid, shares, cuts: [...before.cuts, ...cuts] }
}

function downTo(shares: Share[], limit: string | undefined, field: string, name: string): Step {
  if (limit === undefined) return unchanged(shares)
  const most = halfUpToCents(requireDecimal({ field, value: limit }))
  return { shares: scaledTo(shares, new Exact(most)), reasons: [whole(`${name} ${moneyText(most)}`)] }
}

function outsideTheGroup(shares: Share[], group: string | undefined, { byGroup }: PaidSoFar): Step {
  const payerOf = (practice: string) => byGroup.get(`${group}/${practice}`)
  const taken = practicesOf(shares).filter((practice) => payerOf(practice) !== undefined)
  if (taken.length === 0) return unchanged(shares)
  return {
    shares: shares.filter(({ practice }) => !taken.includes(practice)),
    reasons: taken.map((practice) => ({
      reason: `practice ${practice} is already paid by ${payerOf(practice)} of the same group`,
      weight: sumOf(shares.filter((share) => share.practice === practice)),
    })),
  }
}

/** Whole cents, rounded down, so that no rounding can lift the whole above its limit. */
const limitOf = (cost: ExactNumber, percent: number): ExactNumber =>
  cost.times(percent).dividedBy(100).toDecimalPlaces(2, Exact.ROUND_DOWN)

function insideTheJob(shares: Share[], paid: PaidSoFar, rule: StackRule): Step {
  const room = limitOf(rule.estimatedCost, rule.limitPercent).minus(paid.total)
  return {
    shares: scaledTo(shares, Exact.max(room, 0)),
    reasons: [whole(`stack limit ${rule.limitPercent} % of estimated cost`)],
  }
}

function insideEachPractice(shares: Share[], paid: PaidSoFar, rule: StackRule): Step {
  const over = practicesOf(shares).flatMap((practice) => {
    const sum = sumOf(shares.filter((share) => share.practice === practice))
    const cost = exactSum(rule.lines.filter((line) => line.practice === practice).map((line) => line.cost))
    const open = limitOf(cost, rule.limitPercent).minus(paid.byPractice.get(practice) ?? 0)
    const room = Exact.max(open, 0)
    return sum.lessThanOrEqualTo(room) ? [] : [{ practice, room, sum }]
  })
  if (over.length === 0) return unchanged(shares)
  return {
    shares: shares.map((share) => {
      const held = over.find(({ practice }) => practice === share.practice)
      return held ? { ...share, amount: share.amount.times(held.room).dividedBy(held.sum) } : share
    }),
    reasons: over.map(({ practice, room, sum }) => ({
      reason: `stack limit ${rule.limitPercent} % of estimated cost, practice ${practice}`,
      weight: sum.minus(room),
    })),
  }
}

function scaledTo(shares: Share[], most: ExactNumber): Share[] {
  const sum = sumOf(shares)
  if (sum.lessThanOrEqualTo(most)) return shares
  return shares.map((share) => ({ ...share, amount: share.amount.times(most).dividedBy(sum) }))
}
