import { requireNumber } from '../require-number.js'
import { bermArms } from './berm-arms.js'
import { bermChannel } from './berm-channel.js'
import type { BermDesignInput, BermDesignResult } from './berm-design-types.js'
import { bermEarth } from './berm-earth.js'
import { bermHydraulics } from './berm-hydraulics.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

/**
 * Berm above the ramp: depth of its channel, height, section, length, earth and ends.
 * Crest above channel = max(depth + freeboard, minimum height); the section is `ridgeSection`; length is `bermArms`.
 * With 'both' the larger arm's flow sizes the whole berm. Without flow the minimum height governs.
 *
 * @returns depths, heights and reaches in ft, velocities in ft/s, section in ft², earth in yd³, footprint in ft².
 * @throws EngineeringInputError naming the field.
 * Source: FHWA HEC-22, 4th ed., Feb 2024, ch. 6 (flow); plane geometry (ridge); freeboard, settlement and least height
 * are district settings.
 * @example bermDesign({ flowCfs: 7.002, channelGradeFtPerFt: 0.008, groundFallFtPerFt: 1 / 30, upslopeRunPerRise: 4, downslopeRunPerRise: 4, topWidthFt: 4, resistanceHigh: { roughness: 0.1 }, resistanceLow: { roughness: 0.04 }, freeboardFt: 0.3, minimumHeightFt: 1, settlementPercent: 10, rampWidthFt: 18, rampEdgeCutFt: 0, pastEdgeFt: { left: 45, right: 15 }, falls: 'left', outlets: [] }).areaFt2 // 13.76
 */
export function bermDesign(input: BermDesignInput): BermDesignResult {
  const flowCfs = requireNumber({ field: 'flowCfs', value: input.flowCfs, min: 0 })
  const value = input.channelGradeFtPerFt
  requireNumber({ field: 'channelGradeFtPerFt', value, exclusiveMin: 0, max: 1 })
  const freeboard = requireNumber({ field: 'freeboardFt', value: input.freeboardFt, min: 0 })
  const minimum = requireNumber({ field: 'minimumHeightFt', value: input.minimumHeightFt, min: 0 })

  const { lengthFt, ends, armFlowCfs, channelFallFt } = bermArms({ ...input, flowCfs })
  const channel = bermChannel({ ...input, flowCfs })
  const { notes, ...hydraulics } = bermHydraulics({ ...input, channel, armFlowCfs })
  const wanted = hydraulics.depthFt + freeboard
  const crestAboveChannelFt = Math.max(wanted, minimum)
  const { ridge, crossing, ...earth } = bermEarth({ design: input, crestAboveChannelFt, lengthFt })
  const downslopeReach = Math.max(ridge.downslopeReachFt, crossing?.downslopeReachFt ?? 0)

  return {
    ...(channel && { channel }),
    armFlowCfs,
    ...hydraulics,
    crestAboveChannelFt,
    heightGovernedBy: wanted >= minimum ? 'depth and freeboard' : 'minimum height',
    ...ridge,
    downslopeFootFromCentreFt: input.topWidthFt / 2 + downslopeReach,
    earthYd3PerFt: ridge.areaFt2 / FT3_PER_YD3,
    lengthFt,
    ...earth,
    channelFallFt,
    ends,
    ...(crossing && { crossing }),
    notes,
  }
}
