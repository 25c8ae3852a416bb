import { placesOf } from '../money/rounded-quantity.js'
import { noBreakSpace } from './no-break-space.js'
import { trimmedNumber } from './trimmed-number.js'

const unitWords: { readonly [unit: string]: readonly [one: string, many: string] } = {
  yd3: ['yd³', 'yd³'],
  yd2: ['yd²', 'yd²'],
  ft2: ['ft²', 'ft²'],
  ft3: ['ft³', 'ft³'],
  ton: ['ton', 'tons'],
  acre: ['acre', 'acres'],
  each: ['', ''],
}

/** The unit as people read it, in the number the quantity asks for. */
export function unitText(unit: string, quantity = 2): string {
  const words = unitWords[unit]
  return words ? words[quantity === 1 ? 0 : 1] : unit
}

/** A payable quantity just as it is multiplied: formatQuantity(34.077, 'ton') is "34.077 tons". */
export function formatQuantity(quantity: number, unit: string): string {
  const word = unitText(unit, quantity)
  return `${trimmedNumber(quantity, placesOf(unit))}${word ? noBreakSpace : ''}${word}`
}
