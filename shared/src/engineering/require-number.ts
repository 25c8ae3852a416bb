import { EngineeringInputError } from './engineering-input-error.js'

export interface NumberRule {
  /** The input's own name, as the caller wrote it. */
  field: string
  /** Unknown, because typed and imported values reach the formulas too. */
  value: unknown
  min?: number
  max?: number
  exclusiveMin?: number
  exclusiveMax?: number
  integer?: boolean
}

const BOUNDS = [
  { key: 'min', words: 'at least', holds: (value: number, bound: number) => value >= bound },
  { key: 'exclusiveMin', words: 'greater than', holds: (value: number, bound: number) => value > bound },
  { key: 'max', words: 'at most', holds: (value: number, bound: number) => value <= bound },
  { key: 'exclusiveMax', words: 'less than', holds: (value: number, bound: number) => value < bound },
] as const

/**
 * The one range check of all formulas.
 *
 * @returns the value as a finite number inside its limits; -0 comes back as 0, so that no result prints "-0".
 * @throws EngineeringInputError naming the field, the value and what would be right.
 * @example requireNumber({ field: 'widthFt', value: 18, exclusiveMin: 0 }) // 18
 */
export function requireNumber(rule: NumberRule): number {
  const { value } = rule
  if (typeof value !== 'number' || !Number.isFinite(value)) return refuse(rule)
  const inside = BOUNDS.every(({ key, holds }) => {
    const bound = rule[key]
    return bound === undefined || holds(value, bound)
  })
  if (!inside || (rule.integer && !Number.isInteger(value))) return refuse(rule)
  return value === 0 ? 0 : value
}

function refuse(rule: NumberRule): never {
  const limits = BOUNDS.flatMap(({ key, words }) => {
    const bound = rule[key]
    return bound === undefined ? [] : [`${words} ${bound}`]
  })
  const kind = rule.integer ? 'a whole number' : 'a number'
  const wanted = [kind, limits.join(' and ')].filter(Boolean).join(' ')
  const message = `${rule.field} is ${inWords(rule.value)}; it must be ${wanted}.`
  throw new EngineeringInputError({ field: rule.field, message })
}

function inWords(value: unknown): string {
  if (value === undefined || value === null || value === '') return 'missing'
  if (typeof value === 'number') return Number.isNaN(value) ? 'not a number' : String(value)
  return typeof value === 'string' ? `"${value}"` : 'not a number'
}
