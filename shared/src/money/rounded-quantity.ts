import { Exact } from './exact.js'

/**
 * Decimal places of a payable quantity by unit. An acre gets five, because its fourth place alone is worth
 * 4.4 square feet.
 */
export const unitPlaces: { readonly [unit: string]: number } = { each: 0, acre: 5 }

export const usualPlaces = 4

export const placesOf = (unit: string): number => unitPlaces[unit] ?? usualPlaces

/** The quantity that is shown and multiplied: rounded once, half up, by the rule of its unit. */
export function roundedQuantity(quantity: number, unit: string): number {
  return new Exact(quantity).toDecimalPlaces(placesOf(unit), Exact.ROUND_HALF_UP).toNumber()
}
