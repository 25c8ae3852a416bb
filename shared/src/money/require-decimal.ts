import { EngineeringInputError } from '../engineering/engineering-input-error.js'
import { Exact, type ExactNumber } from './exact.js'

/**
 * Reads an amount or a rate written as a decimal string. A JS number is refused: it may already have lost a cent.
 *
 * @throws EngineeringInputError naming the field and what would be right.
 */
export function requireDecimal({ field, value }: { field: string; value: unknown }): ExactNumber {
  if (typeof value !== 'string' || !/^\d{1,12}(\.\d{1,8})?$/.test(value)) {
    const shown = typeof value === 'string' ? `"${value}"` : String(value)
    throw new EngineeringInputError({
      field,
      message: `${field} is ${shown}; it must be dollars written as text, such as "72.59".`,
    })
  }
  return new Exact(value)
}
