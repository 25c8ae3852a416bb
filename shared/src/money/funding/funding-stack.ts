import { EngineeringInputError } from '../../engineering/engineering-input-error.js'
import { requireNumber } from '../../engineering/require-number.js'
import type { Money } from '../../schemas/primitives.js'
import { Exact, exactSum } from '../exact.js'
import { halfUpToCents } from '../half-up-to-cents.js'
import { addMoney, percentOfMoney, subtractMoney } from '../money-arithmetic.js'
import { requireDecimal } from '../require-decimal.js'
import { cutSource } from './cut-source.js'
import { fundLines } from './fund-lines.js'
import type { FundedSource, FundingResult, FundingSource } from './funding-source.js'
import { sourceOffer } from './source-offer.js'
import type { FundableLine, PaidSoFar, StackRule } from './stack-state.js'

export interface FundingStackInput {
  lines: readonly {
    key: string
    practice: string
    quantity: number
    unit?: string
    basis?: 'in-place' | 'order'
  }[]
  cost: { lines: readonly { key: string; amount: string }[]; total: string }
  /** In the order in which they pay. */
  sources: readonly FundingSource[]
  /** All sources together as a percent of the cost; 100 unless less is set. */
  stackLimitPercent?: number
  stackScope?: 'job' | 'practice'
}

/**
 * Works the sources in the order given. Each offers what its kind says, is cut by its own cap, the person's
 * limit, its exclusive group and last by the stack limit, and every cut is itemised. Decimal arithmetic; no
 * source pays less than nothing; all together never pay above the limit.
 *
 * Source of the 100 percent limit: 7 CFR 1465.23(a)(3); Wis. Adm. Code ATCP 50.42.
 *
 * @throws EngineeringInputError for a source that stands there twice, an amount that is no decimal text or a percent
 *   outside 0 to 100.
 */
export function fundingStack(input: FundingStackInput): FundingResult {
  refuseRepeated(input.sources)
  const rule = stackRule(input)
  const funded: FundedSource[] = []
  let paid: PaidSoFar = { total: new Exact(0), byPractice: new Map(), byGroup: new Map() }
  for (const source of input.sources) {
    const result = fundedSource(source, paid, rule)
    funded.push(result)
    paid = withPaid(paid, source, result, rule.lines)
  }
  const cost = halfUpToCents(rule.estimatedCost)
  const totalPaid = addMoney(...funded.map((source) => source.paid))
  return {
    sources: funded,
    totalPaid,
    landownerShare: subtractMoney(cost, totalPaid),
    perPractice: perPractice(rule.lines, paid),
  }
}

/** A cap and a person's limit hold for all that one fund pays, so a fund pays in one place. */
function refuseRepeated(sources: readonly FundingSource[]): void {
  const keys = sources.map(({ key }) => key)
  const repeated = sources.find(({ key }, index) => keys.indexOf(key) < index)
  if (!repeated) return
  const { key, name } = repeated
  const message = `${name ?? key} is named twice among the funds of this design. Name it once; its cap holds for all that it pays.`
  throw new EngineeringInputError({ field: key, message })
}

function stackRule({ lines, cost, stackLimitPercent, stackScope }: FundingStackInput): StackRule {
  const amounts = new Map(
    cost.lines.map(({ key, amount }) => [key, requireDecimal({ field: `cost.${key}`, value: amount })]),
  )
  return {
    limitPercent: requireNumber({
      field: 'stackLimitPercent',
      value: stackLimitPercent ?? 100,
      min: 0,
      max: 100,
    }),
    scope: stackScope ?? 'job',
    estimatedCost: requireDecimal({ field: 'cost.total', value: cost.total }),
    lines: lines.map(({ key, practice, quantity }) => ({
      key,
      practice,
      quantity: requireNumber({ field: `lines.${key}.quantity`, value: quantity, min: 0 }),
      cost: amounts.get(key) ?? new Exact(0),
    })),
  }
}

function fundedSource(source: FundingSource, paidBefore: PaidSoFar, rule: StackRule): FundedSource {
  const offer = sourceOffer(source, rule.lines, paidBefore)
  const { paid, shares, cuts } = cutSource(source, offer, paidBefore, rule)
  const advancePercent = requireNumber({
    field: `${source.key}.advancePercent`,
    value: source.advancePercent ?? 0,
    min: 0,
    max: 100,
  })
  const { key, name, kind } = source
  return {
    key,
    name: name ?? key,
    kind,
    ...(kind === 'percent-of-cost' ? { percentOf: source.percentOf ?? 'estimated-cost' } : {}),
    ...(offer.base === undefined ? {} : { base: offer.base }),
    offered: offer.offered,
    paid,
    cuts,
    lines: fundLines(paid, shares),
    advance: percentOfMoney(paid, advancePercent),
  }
}

function withPaid(
  before: PaidSoFar,
  { key, exclusiveGroup }: FundingSource,
  { paid, lines }: FundedSource,
  bill: readonly FundableLine[],
): PaidSoFar {
  const practiceOf = new Map(bill.map((line) => [line.key, line.practice]))
  const byPractice = new Map(before.byPractice)
  const byGroup = new Map(before.byGroup)
  for (const line of lines) {
    const practice = practiceOf.get(line.key)
    if (practice === undefined || line.amount === '0.00') continue
    byPractice.set(practice, (byPractice.get(practice) ?? new Exact(0)).plus(line.amount))
    const group = `${exclusiveGroup}/${practice}`
    if (exclusiveGroup !== undefined && !byGroup.has(group)) byGroup.set(group, key)
  }
  return { total: before.total.plus(paid), byPractice, byGroup }
}

function perPractice(
  lines: readonly FundableLine[],
  { byPractice }: PaidSoFar,
): { practice: string; cost: Money; paid: Money }[] {
  return [...new Set(lines.map(({ practice }) => practice))].map((practice) => ({
    practice,
    cost: halfUpToCents(exactSum(lines.filter((line) => line.practice === practice).map(({ cost }) => cost))),
    paid: halfUpToCents(byPractice.get(practice) ?? new Exact(0)),
  }))
}
