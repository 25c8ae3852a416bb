import { requireNumber } from '../require-number.js'

export interface KirpichInput {
  /** Length of the flow path L, ft, greater than 0. */
  flowLengthFt: number
  /** Mean slope of the flow path S, ft/ft, greater than 0 and at most 1. */
  slopeFtPerFt: number
  /** Multiplier for the surface, 0.1 to 5; 1 unless given, 2 for grassed overland flow, 0.4 for pavement. */
  factor?: number
}

/**
 * Kirpich time of concentration: tc = factor · 0.0078 L^0.77 S^−0.385 minutes.
 *
 * @returns tc in hours.
 * @throws EngineeringInputError naming flowLengthFt, slopeFtPerFt or factor.
 * Source: Texas Department of Transportation, Hydraulic Design Manual, ch. 4 section 11.
 * @example kirpichHr({ flowLengthFt: 1000, slopeFtPerFt: 0.02 }) // 0.1197
 */
export function kirpichHr(input: KirpichInput): number {
  const L = requireNumber({ field: 'flowLengthFt', value: input.flowLengthFt, exclusiveMin: 0, max: 1e6 })
  const S = requireNumber({ field: 'slopeFtPerFt', value: input.slopeFtPerFt, exclusiveMin: 0, max: 1 })
  const factor = requireNumber({ field: 'factor', value: input.factor ?? 1, min: 0.1, max: 5 })
  const minutes = factor * 0.0078 * L ** 0.77 * S ** -0.385
  return minutes / 60
}
