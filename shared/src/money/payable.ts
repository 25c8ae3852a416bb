import { requireNumber } from '../engineering/require-number.js'
import type { Money } from '../schemas/primitives.js'
import { Exact, type ExactNumber } from './exact.js'
import { halfUpToCents } from './half-up-to-cents.js'
import { addMoney, compareMoney, noMoney, percentOfMoney, priceOf } from './money-arithmetic.js'
import type { PayableInput, PayableLine, PayableResult, PayableSource } from './payable-types.js'
import { requireDecimal } from './require-decimal.js'

const amountOf = (field: string, value: string | undefined): Money =>
  halfUpToCents(requireDecimal({ field, value }))

/**
 * What a source owes now: the least of scheduled, designed and built at the frozen rate (or the percent of the
 * documented cost, or the fixed sum), held inside every limit, less hold-back, advances and earlier part payments.
 * Never below 0: what was paid too much is the refund due.
 *
 * @throws EngineeringInputError for a quantity below 0 or an amount that is no decimal text.
 */
export function payable(input: PayableInput): PayableResult {
  const lines = input.lines.map(leastLine)
  const earned = earnedBy(input, lines)
  const { limited, reasons } = insideLimits(input, earned)
  const percent = requireNumber({
    field: 'holdBackPercent',
    value: input.holdBackPercent ?? 0,
    min: 0,
    max: 100,
  })
  const holdBack = input.final ? noMoney : percentOfMoney(limited, percent)
  const lessAdvances = addMoney(...input.advances.map((value) => amountOf('advances', value)))
  const lessPartials = addMoney(...input.partials.map((value) => amountOf('partials', value)))
  const left = new Exact(limited).minus(holdBack).minus(lessAdvances).minus(lessPartials)
  return {
    lines,
    earned,
    holdBack,
    lessAdvances,
    lessPartials,
    payableNow: halfUpToCents(Exact.max(left, 0)),
    refundDue: halfUpToCents(Exact.max(left.negated(), 0)),
    reasons: [...reasons, ...deductions({ holdBack, lessAdvances, lessPartials }, left)],
  }
}

function leastLine({ key, scheduled, designed, built, rate }: PayableLine): PayableResult['lines'][number] {
  const all = { scheduled, designed, built } as const
  const names = ['scheduled', 'designed', 'built'] as const
  for (const name of names) requireNumber({ field: `${key}.${name}`, value: all[name], min: 0 })
  const governs = names.reduce((least, name) => (all[name] < all[least] ? name : least))
  const least = all[governs]
  return { key, least, governs, amount: rate === undefined ? noMoney : priceOf(least, rate) }
}

function earnedBy({ source, documentedCost }: PayableInput, lines: PayableResult['lines']): Money {
  if (source.kind === 'unit-rate') return addMoney(...lines.map(({ amount }) => amount))
  if (source.kind === 'fixed') return amountOf('source.amount', source.amount)
  return percentEarned(source, documentedCost)
}

function percentEarned(
  { percent, baseAtSigning }: Extract<PayableSource, { kind: 'percent-of-cost' }>,
  documentedCost: string | undefined,
): Money {
  const base = Exact.min(
    requireDecimal({ field: 'documentedCost', value: documentedCost }),
    requireDecimal({ field: 'source.baseAtSigning', value: baseAtSigning }),
  )
  return halfUpToCents(
    base.times(requireNumber({ field: 'source.percent', value: percent, min: 0, max: 100 })).dividedBy(100),
  )
}

const limitsOf = [
  { field: 'paidAtSigning', words: 'what was agreed at signing' },
  { field: 'capLeft', words: 'what is left of the source cap' },
  { field: 'personLimitLeft', words: 'what is left of the person limit' },
  { field: 'stackRoom', words: 'what the stack limit leaves at the documented cost' },
] as const

function insideLimits(input: PayableInput, earned: Money): { limited: Money; reasons: string[] } {
  let limited = earned
  const reasons: string[] = []
  for (const { field, words } of limitsOf) {
    const value = input[field]
    if (value === undefined) continue
    const limit = amountOf(field, value)
    if (compareMoney(limit, limited) >= 0) continue
    reasons.push(`Held to ${words}, ${limit}.`)
    limited = limit
  }
  return { limited, reasons }
}

function deductions(
  taken: Pick<PayableResult, 'holdBack' | 'lessAdvances' | 'lessPartials'>,
  left: ExactNumber,
) {
  const words = {
    holdBack: 'held back until the final payment',
    lessAdvances: 'paid in advance',
    lessPartials: 'paid in part before',
  } as const
  const keys = ['holdBack', 'lessAdvances', 'lessPartials'] as const
  const reasons = keys
    .filter((key) => taken[key] !== noMoney)
    .map((key) => `Less ${taken[key]} ${words[key]}.`)
  return left.isNegative() ? [...reasons, 'More has been paid than was earned.'] : reasons
}
