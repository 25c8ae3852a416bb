import { requireNumber } from '../require-number.js'

export interface DrinkingAtOnceInput {
  headCount: number
  /** Share of the herd, 0.1 for 10 %. */
  shareAtOnce: number
}

/**
 * Head that drink at the same time: head · share, up to the next whole animal.
 *
 * @param input.headCount whole number ≥ 1.
 * @param input.shareAtOnce share > 0 and ≤ 1. Published: 0.02–0.04 where cattle come singly, 0.05–0.10 as a herd.
 * @returns head, a whole number.
 * @throws EngineeringInputError naming the field.
 * @see Ohio State University Extension, fact sheet ANR-12, 11 February 2003; the share is a district setting.
 * @example drinkingAtOnce({ headCount: 75, shareAtOnce: 0.1 }) // 8
 */
export function drinkingAtOnce({ headCount, shareAtOnce }: DrinkingAtOnceInput): number {
  const head = requireNumber({ field: 'headCount', value: headCount, min: 1, integer: true })
  const share = requireNumber({ field: 'shareAtOnce', value: shareAtOnce, exclusiveMin: 0, max: 1 })
  return Math.ceil(head * share - 1e-9)
}
