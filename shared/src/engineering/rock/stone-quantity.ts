import { FT3_PER_YD3 } from '../unit-factors.js'

export interface StoneRates {
  unitWeightTonsPerYd3: number
  wastePercent: number
  truckTons: number | undefined
}

export interface StoneQuantity {
  volumeFt3: number
  volumeYd3: number
  /** Short tons in place. */
  tons: number
  /** Short tons to order, with waste. */
  orderTons: number
  loads?: number
}

/** Tons, order tons and truck loads of a placed volume. Stones of two kinds do not share a truck. */
export function stoneQuantity({ volumeFt3, rates }: { volumeFt3: number; rates: StoneRates }): StoneQuantity {
  const volumeYd3 = volumeFt3 / FT3_PER_YD3
  const tons = volumeYd3 * rates.unitWeightTonsPerYd3
  const orderTons = tons * (1 + rates.wastePercent / 100)
  const quantity = { volumeFt3, volumeYd3, tons, orderTons }
  return rates.truckTons === undefined
    ? quantity
    : { ...quantity, loads: Math.ceil(orderTons / rates.truckTons - 1e-9) }
}
