import type { Money } from '../schemas/primitives.js'

export interface PayableLine {
  key: string
  scheduled: number
  designed: number
  built: number
  /** The rate frozen at signing, dollars a unit; only for a unit-rate source. */
  rate?: string
}

export type PayableSource =
  | { key?: string; kind: 'unit-rate' }
  | { key?: string; kind: 'percent-of-cost'; percent: number; baseAtSigning: string }
  | { key?: string; kind: 'fixed'; amount: string }

export interface PayableInput {
  source: PayableSource
  lines: readonly PayableLine[]
  /** Eligible cost that bills prove; a percent of cost needs it. */
  documentedCost?: string
  paidAtSigning: string
  capLeft?: string
  personLimitLeft?: string
  /** What the stack limit leaves at the documented cost. */
  stackRoom?: string
  advances: readonly string[]
  partials: readonly string[]
  holdBackPercent?: number
  final: boolean
}

export interface PayableResult {
  lines: { key: string; least: number; governs: 'scheduled' | 'designed' | 'built'; amount: Money }[]
  earned: Money
  holdBack: Money
  lessAdvances: Money
  lessPartials: Money
  payableNow: Money
  refundDue: Money
  /** Each limit or deduction that lowered the payment, in a sentence. */
  reasons: string[]
}
