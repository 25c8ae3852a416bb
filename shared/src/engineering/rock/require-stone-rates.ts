import { requireNumber } from '../require-number.js'
import type { StoneRates } from './stone-quantity.js'

interface StoneRatesInput {
  /** Start of the field names, `layers[0].` or nothing. */
  prefix: string
  unitWeightTonsPerYd3: number
  wastePercent: number
  truckTons?: number
}

/** Unit weight, waste and truck of one stone, checked. */
export function requireStoneRates(input: StoneRatesInput): StoneRates {
  const { prefix, truckTons } = input
  return {
    unitWeightTonsPerYd3: requireNumber({
      field: `${prefix}unitWeightTonsPerYd3`,
      value: input.unitWeightTonsPerYd3,
      exclusiveMin: 0,
      max: 4,
    }),
    wastePercent: requireNumber({
      field: `${prefix}wastePercent`,
      value: input.wastePercent,
      min: 0,
      max: 100,
    }),
    truckTons:
      truckTons === undefined
        ? undefined
        : requireNumber({ field: `${prefix}truckTons`, value: truckTons, exclusiveMin: 0 }),
  }
}
