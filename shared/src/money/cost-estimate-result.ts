import type { Money } from '../schemas/primitives.js'

export interface CostEstimateLine {
  key: string
  practice: string
  description: string
  quantity: number
  unit: string
  /** Dollars a unit, as in the cost list. */
  unitCost: { low: string; typical: string; high: string }
  low: Money
  /** The amount that funding is held against. */
  typical: Money
  high: Money
}

export interface CostEstimate {
  lines: CostEstimateLine[]
  low: Money
  typical: Money
  high: Money
}
