import { requireNumber } from '../engineering/require-number.js'
import type { Money } from '../schemas/primitives.js'
import { Exact } from './exact.js'
import { halfUpToCents } from './half-up-to-cents.js'
import { requireDecimal } from './require-decimal.js'

export interface AverageAnnualCostInput {
  installedCost: string
  lifeYears: number
  interestRatePercent: number
  operationAndMaintenancePercent: number
}

/**
 * Yearly cost of an alternative over its life: cost · i(1 + i)ⁿ / ((1 + i)ⁿ − 1), the capital recovery factor, plus
 * upkeep as a percent of the cost. At no interest the cost is spread evenly.
 */
export function averageAnnualCost(input: AverageAnnualCostInput): Money {
  const cost = requireDecimal({ field: 'installedCost', value: input.installedCost })
  const years = requireNumber({ field: 'lifeYears', value: input.lifeYears, exclusiveMin: 0, max: 200 })
  const rate = { field: 'interestRatePercent', value: input.interestRatePercent, min: 0, max: 100 }
  const interest = new Exact(requireNumber(rate)).dividedBy(100)
  const upkeepPercent = requireNumber({
    field: 'operationAndMaintenancePercent',
    value: input.operationAndMaintenancePercent,
    min: 0,
    max: 100,
  })
  const growth = interest.plus(1).pow(years)
  const factor = interest.isZero()
    ? new Exact(1).dividedBy(years)
    : interest.times(growth).dividedBy(growth.minus(1))
  return halfUpToCents(cost.times(factor.plus(new Exact(upkeepPercent).dividedBy(100))))
}
