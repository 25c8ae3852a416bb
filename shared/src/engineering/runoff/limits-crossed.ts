import type { LimitedField, LimitedMethod, MethodLimit } from './method-limits.js'

export interface CrossedLimit {
  field: LimitedField
  fromMemory: boolean
  /** One sentence naming method, field, value, limit and source. */
  sentence: string
}

interface LimitsCrossedInput {
  method: LimitedMethod
  values: Partial<Record<LimitedField, number>>
  limits: readonly MethodLimit[]
}

const WORDS = [
  ['min', 'at least', (value: number, bound: number) => value >= bound],
  ['exclusiveMin', 'above', (value: number, bound: number) => value > bound],
  ['max', 'at most', (value: number, bound: number) => value <= bound],
  ['exclusiveMax', 'below', (value: number, bound: number) => value < bound],
] as const

/**
 * Limits of use that a site does not meet, for one method.
 *
 * @returns one entry per limit crossed, none when the method may be used.
 * @example limitsCrossed({ method: 'graphical', values: { curveNumber: 35 }, limits: methodLimits }).length // 1
 */
export function limitsCrossed({ method, values, limits }: LimitsCrossedInput): CrossedLimit[] {
  return limits
    .filter((limit) => limit.method === method)
    .flatMap((limit) => {
      const value = values[limit.field]
      if (value === undefined) return []
      const given = WORDS.flatMap(([key, words, holds]) => {
        const bound = limit[key]
        return bound === undefined ? [] : [{ words: `${words} ${bound}`, holds: holds(value, bound) }]
      })
      if (given.every(({ holds }) => holds)) return []
      const range = [given.map(({ words }) => words).join(' and '), limit.unit].filter(Boolean).join(' ')
      const sentence = `${limit.field} is ${value}; the ${method} method is for ${range} (${limit.source}).`
      return [{ field: limit.field, fromMemory: limit.fromMemory, sentence }]
    })
}
