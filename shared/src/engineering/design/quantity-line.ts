import type { QuantityKey } from './quantity-catalogue.js'

/** One line of the bill of quantities: the list that cost, funding, packet and check-out share. */
export interface QuantityLine {
  key: QuantityKey
  practice: string
  description: string
  unit: string
  /** What is ordered, priced and offered for funding, rounded once by the unit's rule: shown and multiplied. */
  quantity: number
  /** What lies in the ground when it is done: without waste, laps and trim. */
  inPlaceQuantity: number
  /** Which of the two `quantity` is. */
  basis: 'in-place' | 'order'
  /** Where the figure comes from, in words. */
  fromFigure: string
}
