import { requireNumber } from '../require-number.js'
import { MANNING_K } from './hydraulic-constants.js'

export interface ManningVelocityInput {
  /** Flow area over wetted perimeter R, ft, 0 or more. */
  hydraulicRadiusFt: number
  /** Slope of the channel S, ft/ft, greater than 0 and at most 1. */
  slopeFtPerFt: number
  /** Manning n, 0.005 to 1. */
  roughness: number
}

/**
 * Mean velocity of uniform flow: V = (1.486/n) R^⅔ S^½.
 *
 * @returns V in ft/s.
 * @throws EngineeringInputError naming the field.
 * Source: FHWA HEC-22, Urban Drainage Design Manual, 4th ed., FHWA-HIF-24-006, Feb 2024, ch. 6, eq. 6.5.
 * @example manningVelocityFtPerS({ hydraulicRadiusFt: 0.931, slopeFtPerFt: 0.01, roughness: 0.03 }) // 4.722
 */
export function manningVelocityFtPerS(input: ManningVelocityInput): number {
  const R = requireNumber({ field: 'hydraulicRadiusFt', value: input.hydraulicRadiusFt, min: 0 })
  const S = requireNumber({ field: 'slopeFtPerFt', value: input.slopeFtPerFt, exclusiveMin: 0, max: 1 })
  const n = requireNumber({ field: 'roughness', value: input.roughness, min: 0.005, max: 1 })
  return (MANNING_K / n) * R ** (2 / 3) * S ** 0.5
}
