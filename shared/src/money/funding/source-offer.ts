import { EngineeringInputError } from '../../engineering/engineering-input-error.js'
import { requireNumber } from '../../engineering/require-number.js'
import type { Money } from '../../schemas/primitives.js'
import { Exact, exactSum, type ExactNumber } from '../exact.js'
import { halfUpToCents } from '../half-up-to-cents.js'
import { requireDecimal } from '../require-decimal.js'
import type { FundingSource } from './funding-source.js'
import type { FundableLine, PaidSoFar, Share } from './stack-state.js'

export interface SourceOffer {
  offered: Money
  /** What a percent was taken of. */
  base?: Money
  shares: Share[]
}

const offerOf = {
  'unit-rate': unitRateOffer,
  'percent-of-cost': percentOffer,
  fixed: fixedOffer,
} as const

/** What a source would pay if nothing cut it. Rounded as its kind says: by line, or once for the whole source. */
export function sourceOffer(
  source: FundingSource,
  lines: readonly FundableLine[],
  paid: PaidSoFar,
): SourceOffer {
  const eligible = lines.filter(({ practice }) => source.practices?.includes(practice) ?? true)
  const offer = offerOf[source.kind]
  if (!offer) {
    const message = `The source ${source.key} has the kind "${String(source.kind)}", which is not known.`
    throw new EngineeringInputError({ field: 'kind', message })
  }
  return offer(source, eligible, paid)
}

function unitRateOffer(source: FundingSource, eligible: readonly FundableLine[]): SourceOffer {
  const shares = (source.lines ?? []).flatMap(({ key, contractedQuantity, rate }) => {
    const line = eligible.find((candidate) => candidate.key === key)
    if (!line) return []
    const quantityUsed = Math.min(line.quantity, contracted(source, key, contractedQuantity))
    const value = new Exact(quantityUsed).times(
      requireDecimal({ field: `${source.key}.${key}.rate`, value: rate }),
    )
    return [{ key, practice: line.practice, quantityUsed, rate, amount: new Exact(halfUpToCents(value)) }]
  })
  return { offered: halfUpToCents(exactSum(shares.map(({ amount }) => amount))), shares }
}

/** Nothing contracted: the whole quantity counts. */
function contracted({ key }: FundingSource, line: string, quantity: number | undefined): number {
  if (quantity === undefined) return Infinity
  return requireNumber({ field: `${key}.${line}.contractedQuantity`, value: quantity, min: 0 })
}

function percentOffer(
  source: FundingSource,
  eligible: readonly FundableLine[],
  paid: PaidSoFar,
): SourceOffer {
  const percent = requireNumber({ field: `${source.key}.percent`, value: source.percent, min: 0, max: 100 })
  const weights = eligible.map((line) => countedCost(source, line))
  const wholeBase = exactSum(weights)
  const base =
    source.percentOf === 'cost-after-earlier-sources'
      ? Exact.min(wholeBase, costLeft(eligible, paid))
      : wholeBase
  const offered = halfUpToCents(base.times(percent).dividedBy(100))
  return { offered, base: halfUpToCents(base), shares: spread(offered, eligible, weights) }
}

function fixedOffer(source: FundingSource, eligible: readonly FundableLine[]): SourceOffer {
  const offered = halfUpToCents(requireDecimal({ field: `${source.key}.amount`, value: source.amount }))
  const weights = eligible.map(({ cost }) => cost)
  return { offered, shares: spread(offered, eligible, weights) }
}

/** A line counts with its cost, or with what the area pays on average when that is less. */
function countedCost({ key, averageUnitCosts }: FundingSource, line: FundableLine): ExactNumber {
  const average = averageUnitCosts?.[line.key]
  if (average === undefined) return line.cost
  const rate = requireDecimal({ field: `${key}.averageUnitCosts.${line.key}`, value: average })
  return Exact.min(line.cost, new Exact(halfUpToCents(rate.times(line.quantity))))
}

/** The eligible cost that earlier sources have left open on the practices of these lines. */
function costLeft(eligible: readonly FundableLine[], { byPractice }: PaidSoFar): ExactNumber {
  const practices = [...new Set(eligible.map(({ practice }) => practice))]
  const cost = exactSum(eligible.map((line) => line.cost))
  const paid = exactSum(practices.map((practice) => byPractice.get(practice) ?? new Exact(0)))
  return Exact.max(cost.minus(paid), 0)
}

function spread(offered: Money, lines: readonly FundableLine[], weights: readonly ExactNumber[]): Share[] {
  const whole = exactSum(weights)
  if (whole.isZero()) return []
  return lines.map(({ key, practice, quantity }, index) => ({
    key,
    practice,
    quantityUsed: quantity,
    amount: new Exact(offered).times(weights[index] ?? 0).dividedBy(whole),
  }))
}
