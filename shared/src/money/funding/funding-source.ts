import type { Money } from '../../schemas/primitives.js'

export interface FundingSourceLine {
  /** Key of the line of quantities that this rate pays. */
  key: string
  /** Left out: as much as the design needs. */
  contractedQuantity?: number
  /** Dollars a unit. */
  rate: string
}

/** One fund, resolved to the rates in force. Sources are worked in the order in which they are given. */
export interface FundingSource {
  key: string
  name?: string
  kind: 'unit-rate' | 'percent-of-cost' | 'fixed'
  /** Left out: every practice of the job. */
  practices?: string[]
  lines?: FundingSourceLine[]
  percent?: number
  percentOf?: 'estimated-cost' | 'cost-after-earlier-sources'
  /** The area's average cost of a unit by line key; a dearer line counts only this much. */
  averageUnitCosts?: { [key: string]: string }
  cap?: string
  amount?: string
  personLimitRemaining?: string
  advancePercent?: number
  /** Of the sources of one group only the first pays for a practice. */
  exclusiveGroup?: string
}

export interface FundingCut {
  reason: string
  amount: Money
}

export interface FundedLine {
  key: string
  quantityUsed: number
  rate?: string
  amount: Money
}

export interface FundedSource {
  key: string
  name: string
  kind: FundingSource['kind']
  percentOf?: FundingSource['percentOf']
  /** What a percent was taken of. */
  base?: Money
  offered: Money
  paid: Money
  cuts: FundingCut[]
  /** Sum to `paid`. */
  lines: FundedLine[]
  advance: Money
}

export interface FundingResult {
  sources: FundedSource[]
  totalPaid: Money
  landownerShare: Money
  perPractice: { practice: string; cost: Money; paid: Money }[]
}
