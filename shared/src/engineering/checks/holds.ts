import type { Criterion } from '../../schemas/criteria.js'

export interface HoldsInput {
  comparison: Criterion['comparison']
  actual: number | boolean
  limit: number | readonly [number, number] | undefined
}

/** A figure this near to its limit meets it: sums of binary floats end a hair beside the number people wrote. */
const HAIR = 1e-9

/** Whether a figure meets its limit. */
export function holds({ comparison, actual, limit }: HoldsInput): boolean {
  if (comparison === 'yes') return actual === true
  const value = Number(actual)
  const [low, high] = typeof limit === 'number' || limit === undefined ? [limit, limit] : limit
  const isEnough = comparison === 'at-most' || (low !== undefined && value >= low - HAIR)
  const isNotTooMuch = comparison === 'at-least' || (high !== undefined && value <= high + HAIR)
  return isEnough && isNotTooMuch
}
