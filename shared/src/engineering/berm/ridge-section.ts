import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'

export interface RidgeSectionInput {
  /** Height of the crest above the ground at the foot of its upslope face, ft, 0 or more. */
  crestHeightFt: number
  /** Width of the crest t, ft, 0 or more. */
  topWidthFt: number
  /** Upslope face z1, run per rise, 0 to 100. */
  upslopeRunPerRise: number
  /** Downslope face z2, run per rise, 0 to 100. */
  downslopeRunPerRise: number
  /** Fall of the ground across the ridge q, ft/ft, 0 (level) to 1, with q·z2 below 1. */
  groundFallFtPerFt: number
  /** Extra height for settlement, percent of the height, 0 to 100. */
  settlementPercent: number
}

export interface RidgeSectionResult {
  /** Height of the crest above the ground below its middle, ft, after and before settling. */
  settledHeightFt: number
  builtHeightFt: number
  /** Reach of the built faces from the edges of the crest, ft, level. */
  upslopeReachFt: number
  downslopeReachFt: number
  baseWidthFt: number
  /** Built section, ft². */
  areaFt2: number
}

/**
 * Section of an earth ridge on ground that falls across it.
 * H = h_c + q(t/2 + z1·h_c); H_b = H(1 + settlement); a = z1(H_b − qt/2)/(1 + q·z1); b = z2(H_b + qt/2)/(1 − q·z2);
 * area = t·H_b + ½a(H_b − qt/2) + ½b(H_b + qt/2). On level ground this is t·H_b + ½(z1 + z2)·H_b².
 *
 * @returns heights, reaches and base width in ft, area in ft².
 * @throws EngineeringInputError naming the field; naming downslopeRunPerRise when the face never meets the ground.
 * Source: plane geometry.
 * @example ridgeSection({ crestHeightFt: 1.0672, topWidthFt: 4, upslopeRunPerRise: 4, downslopeRunPerRise: 4, groundFallFtPerFt: 1 / 30, settlementPercent: 10 }).areaFt2 // 13.76
 */
export function ridgeSection(input: RidgeSectionInput): RidgeSectionResult {
  const side = { min: 0, max: 100 }
  const h_c = requireNumber({ field: 'crestHeightFt', value: input.crestHeightFt, min: 0 })
  const t = requireNumber({ field: 'topWidthFt', value: input.topWidthFt, min: 0 })
  const z1 = requireNumber({ field: 'upslopeRunPerRise', value: input.upslopeRunPerRise, ...side })
  const z2 = requireNumber({ field: 'downslopeRunPerRise', value: input.downslopeRunPerRise, ...side })
  const q = requireNumber({ field: 'groundFallFtPerFt', value: input.groundFallFtPerFt, min: 0, max: 1 })
  const settlement = requireNumber({
    field: 'settlementPercent',
    value: input.settlementPercent,
    min: 0,
    max: 100,
  })
  if (q * z2 >= 1) {
    throw new EngineeringInputError({
      field: 'downslopeRunPerRise',
      message: `downslopeRunPerRise is ${z2} on ground that falls ${q} ft/ft: the downslope face never meets the ground; make it steeper.`,
    })
  }
  const H = h_c + q * (t / 2 + z1 * h_c)
  const H_b = H * (1 + settlement / 100)
  const upslopeEdge = H_b - (q * t) / 2
  const downslopeEdge = H_b + (q * t) / 2
  const a = (z1 * upslopeEdge) / (1 + q * z1)
  const b = (z2 * downslopeEdge) / (1 - q * z2)
  return {
    settledHeightFt: H,
    builtHeightFt: H_b,
    upslopeReachFt: a,
    downslopeReachFt: b,
    baseWidthFt: a + t + b,
    areaFt2: t * H_b + (a * upslopeEdge) / 2 + (b * downslopeEdge) / 2,
  }
}
