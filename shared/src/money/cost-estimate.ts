import { EngineeringInputError } from '../engineering/engineering-input-error.js'
import type { CostLine } from '../schemas/cost-list.js'
import type { CostEstimate, CostEstimateLine } from './cost-estimate-result.js'
import { addMoney, priceOf } from './money-arithmetic.js'

export interface PricedQuantity {
  key: string
  practice: string
  description: string
  unit: string
  quantity: number
}

export interface CostEstimateInput {
  lines: readonly PricedQuantity[]
  costList: { name?: string; lines: readonly CostLine[] }
}

/**
 * Prices every line of the bill of quantities at the low, typical and high unit cost of the list. Each line is
 * rounded to cents once; each total is the sum of the lines shown.
 *
 * @throws EngineeringInputError when the list has no price for a line.
 */
export function costEstimate({ lines, costList }: CostEstimateInput): CostEstimate {
  const prices = new Map(costList.lines.map((line) => [line.key, line]))
  const priced = lines.map((line) => pricedLine(line, prices.get(line.key), costList.name))
  return {
    lines: priced,
    low: addMoney(...priced.map(({ low }) => low)),
    typical: addMoney(...priced.map(({ typical }) => typical)),
    high: addMoney(...priced.map(({ high }) => high)),
  }
}

function pricedLine(
  { key, practice, description, unit, quantity }: PricedQuantity,
  price: CostLine | undefined,
  listName = 'in force',
): CostEstimateLine {
  if (!price) {
    throw new EngineeringInputError({
      field: `costList.${key}`,
      message: `The cost list ${listName} has no price for "${description}". The office can add the line ${key}.`,
    })
  }
  const { low, typical, high } = price
  return {
    key,
    practice,
    description,
    quantity,
    unit,
    unitCost: { low, typical, high },
    low: priceOf(quantity, low),
    typical: priceOf(quantity, typical),
    high: priceOf(quantity, high),
  }
}
