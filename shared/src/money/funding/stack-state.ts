import type { ExactNumber } from '../exact.js'

/** One line of the bill, as funding sees it. */
export interface FundableLine {
  key: string
  practice: string
  quantity: number
  cost: ExactNumber
}

/** What a source would pay on one line, not yet in whole cents. */
export interface Share {
  key: string
  practice: string
  quantityUsed: number
  rate?: string
  amount: ExactNumber
}

/** What the earlier sources of the stack have paid. */
export interface PaidSoFar {
  total: ExactNumber
  byPractice: ReadonlyMap<string, ExactNumber>
  /** Exclusive group and practice, and the source that pays there: `group/practice` → source key. */
  byGroup: ReadonlyMap<string, string>
}

export interface StackRule {
  limitPercent: number
  scope: 'job' | 'practice'
  estimatedCost: ExactNumber
  lines: readonly FundableLine[]
}
