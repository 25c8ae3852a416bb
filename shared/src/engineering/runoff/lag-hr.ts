import { requireNumber } from '../require-number.js'
import { potentialRetentionIn } from './potential-retention-in.js'
import { CURVE_NUMBER_RANGE } from './runoff-limits.js'

export interface LagInput {
  /** Longest flow path l, ft, greater than 0. */
  flowLengthFt: number
  /** Curve number, 30 to 100. */
  curveNumber: number
  /** Mean slope of the land Y (not of the channel), percent, greater than 0 and at most 100. */
  landSlopePercent: number
}

/**
 * Watershed lag: L = l^0.8 (S + 1)^0.7 / (1900 Y^0.5).
 *
 * @returns L in hours; the time of concentration is L/0.6.
 * @throws EngineeringInputError naming flowLengthFt, curveNumber or landSlopePercent.
 * Source: USDA NRCS, National Engineering Handbook Part 630, ch. 15, Time of Concentration, May 2010.
 * @example lagHr({ flowLengthFt: 6900, curveNumber: 75, landSlopePercent: 2.8 }) // 1.034
 */
export function lagHr(input: LagInput): number {
  const l = requireNumber({ field: 'flowLengthFt', value: input.flowLengthFt, exclusiveMin: 0, max: 1e6 })
  const CN = requireNumber({ field: 'curveNumber', value: input.curveNumber, ...CURVE_NUMBER_RANGE })
  const Y = requireNumber({
    field: 'landSlopePercent',
    value: input.landSlopePercent,
    exclusiveMin: 0,
    max: 100,
  })
  const S = potentialRetentionIn(CN)
  return (l ** 0.8 * (S + 1) ** 0.7) / (1900 * Y ** 0.5)
}
