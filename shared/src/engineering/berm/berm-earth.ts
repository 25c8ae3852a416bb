import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { BermDesignInput } from './berm-design-types.js'
import { ridgeSection, type RidgeSectionResult } from './ridge-section.js'
import { sectionGeometry } from './section-geometry.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface BermEarth {
  ridge: RidgeSectionResult
  crossing?: RidgeSectionResult & { lengthFt: number }
  earthCompactedYd3: number
  earthBankYd3: number
  channelCutYd3: number
  footprintFt2: number
}

interface BermEarthInput {
  design: BermDesignInput
  crestAboveChannelFt: number
  lengthFt: number
}

const CROSSING_RUN_PER_RISE = 8

/**
 * Earth of a berm: the built ridge over its length, a flatter one where cattle cross, less what a cut channel gives.
 * Compacted = Σ area · length / 27; bank = compacted/(1 − shrink) − channel area · length / 27, never below 0.
 *
 * @returns sections, volumes in yd³ and the ground covered in ft².
 * @throws EngineeringInputError naming the field.
 * Source: plane geometry; shrinkage common practice.
 * @example bermEarth({ design, crestAboveChannelFt: 1.0672, lengthFt: 78 }).earthCompactedYd3 // 39.75
 */
export function bermEarth({ design, crestAboveChannelFt, lengthFt }: BermEarthInput): BermEarth {
  const cut = cutSection(design, crestAboveChannelFt)
  const section = (sides: { upslopeRunPerRise: number; downslopeRunPerRise: number }) =>
    ridgeSection({
      ...sides,
      crestHeightFt: crestAboveChannelFt - cut.depthFt,
      topWidthFt: design.topWidthFt,
      groundFallFtPerFt: design.groundFallFtPerFt,
      settlementPercent: design.settlementPercent,
    })
  const ridge = section(design)
  const crossing = crossingOf(design, lengthFt, section)
  const crossingFt = crossing?.lengthFt ?? 0
  const alongBoth = (own: number, atCrossing: number) =>
    own * (lengthFt - crossingFt) + atCrossing * crossingFt
  const shrinkPercent = requireNumber({
    field: 'shrinkPercent',
    value: design.shrinkPercent ?? 0,
    min: 0,
    exclusiveMax: 100,
  })
  const earthCompactedYd3 = alongBoth(ridge.areaFt2, crossing?.areaFt2 ?? 0) / FT3_PER_YD3
  const channelCutYd3 = (cut.areaFt2 * lengthFt) / FT3_PER_YD3
  return {
    ridge,
    ...(crossing && { crossing }),
    earthCompactedYd3,
    earthBankYd3: Math.max(0, earthCompactedYd3 / (1 - shrinkPercent / 100) - channelCutYd3),
    channelCutYd3,
    footprintFt2: alongBoth(ridge.baseWidthFt, crossing?.baseWidthFt ?? 0) + cut.topWidthFt * lengthFt,
  }
}

function cutSection({ cutChannel }: BermDesignInput, crestAboveChannelFt: number) {
  if (!cutChannel) return { depthFt: 0, areaFt2: 0, topWidthFt: 0 }
  const depthFt = requireNumber({
    field: 'cutChannel.cutDepthFt',
    value: cutChannel.cutDepthFt,
    exclusiveMin: 0,
  })
  if (depthFt >= crestAboveChannelFt) {
    throw new EngineeringInputError({
      field: 'cutChannel.cutDepthFt',
      message: `cutChannel.cutDepthFt is ${depthFt}; a channel that deep needs no berm. Make it shallower than ${crestAboveChannelFt.toFixed(2)} ft.`,
    })
  }
  return { depthFt, ...sectionGeometry(cutChannel, depthFt) }
}

function crossingOf(
  { crossing }: BermDesignInput,
  berm: number,
  section: (sides: { upslopeRunPerRise: number; downslopeRunPerRise: number }) => RidgeSectionResult,
) {
  if (!crossing) return undefined
  const value = crossing.lengthFt
  const lengthFt = requireNumber({ field: 'crossing.lengthFt', value, exclusiveMin: 0, max: berm })
  const side = requireNumber({
    field: 'crossing.sideRunPerRise',
    value: crossing.sideRunPerRise ?? CROSSING_RUN_PER_RISE,
    min: 1,
    max: 100,
  })
  return { ...section({ upslopeRunPerRise: side, downslopeRunPerRise: side }), lengthFt }
}
