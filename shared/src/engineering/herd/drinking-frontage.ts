import { requireNumber } from '../require-number.js'
import { drinkingAtOnce } from './drinking-at-once.js'

export interface DrinkingFrontageInput {
  headCount: number
  shareAtOnce: number
  /** Water's edge for one drinking animal, ft. */
  ftPerHead?: number
  widthFt: number
}

export interface DrinkingFrontage {
  drinkingAtOnce: number
  neededFt: number
  haveFt: number
  isEnough: boolean
}

/** ANR-12: 2 ft of edge for every drinking head. */
const DEFAULT_FT_PER_HEAD = 2

/**
 * Water's edge that the drinking animals need against the width of the ramp: needed = head at once · ftPerHead.
 *
 * @param input.headCount whole number ≥ 1; input.shareAtOnce > 0 and ≤ 1; input.ftPerHead ft > 0, 2 unless given;
 *   input.widthFt ramp width, ft > 0.
 * @returns head at once, needed and present ft, and whether they are enough.
 * @throws EngineeringInputError naming the field.
 * @see Ohio State University Extension, fact sheet ANR-12, 11 February 2003.
 * @example drinkingFrontage({ headCount: 75, shareAtOnce: 0.1, widthFt: 18 }).neededFt // 16
 */
export function drinkingFrontage(input: DrinkingFrontageInput): DrinkingFrontage {
  const { ftPerHead = DEFAULT_FT_PER_HEAD } = input
  const perHeadFt = requireNumber({ field: 'ftPerHead', value: ftPerHead, exclusiveMin: 0 })
  const haveFt = requireNumber({ field: 'widthFt', value: input.widthFt, exclusiveMin: 0 })
  const head = drinkingAtOnce(input)
  const neededFt = head * perHeadFt
  return { drinkingAtOnce: head, neededFt, haveFt, isEnough: neededFt <= haveFt + 1e-9 }
}
