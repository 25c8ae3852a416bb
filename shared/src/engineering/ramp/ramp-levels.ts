import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'
import type { RampProfileInput } from './ramp-profile.js'

export type ToeRule = 'full pool - toe depth' | 'low water - drinking depth'

export interface RampLevels {
  fullPoolElevationFt: number
  lowWaterElevationFt: number
  /** True when neither low water nor a drawdown was entered. */
  lowWaterIsAssumed: boolean
  topElevationFt: number
  toeElevationFt: number
  toeGovernedBy: ToeRule
  drinkingDepthAtLowWaterFt: number
  waterSurfaceTodayFt: number | undefined
}

/** K-State, George & Murphy, Construction of a Limited Access Ramp: allow at least a 4 ft fall of the water level. */
const ASSUMED_DRAWDOWN_FT = 4

/** Elevations of the ramp from the water levels. The toe is the lower of the two rules. */
export function rampLevels(input: RampProfileInput): RampLevels {
  const fullPoolElevationFt = requireNumber({
    field: 'fullPoolElevationFt',
    value: input.fullPoolElevationFt,
  })
  const lowWaterElevationFt = lowWater(input, fullPoolElevationFt)
  const atLeastZero = (field: 'topAboveFullPoolFt' | 'toeBelowFullPoolFt' | 'drinkingDepthAtLowWaterFt') =>
    requireNumber({ field, value: input[field], min: 0 })
  const topElevationFt = fullPoolElevationFt + atLeastZero('topAboveFullPoolFt')
  const drinkingDepthAtLowWaterFt = atLeastZero('drinkingDepthAtLowWaterFt')
  const byPool = fullPoolElevationFt - atLeastZero('toeBelowFullPoolFt')
  const byDrinking = lowWaterElevationFt - drinkingDepthAtLowWaterFt
  const toeElevationFt = Math.min(byPool, byDrinking)
  if (toeElevationFt >= topElevationFt) {
    throw new EngineeringInputError({
      field: 'toeBelowFullPoolFt',
      message: `The toe at ${forWords(toeElevationFt)} ft does not lie below the ramp top at ${forWords(topElevationFt)} ft; make it deeper.`,
    })
  }
  const { waterSurfaceTodayFt } = input
  return {
    fullPoolElevationFt,
    lowWaterElevationFt,
    lowWaterIsAssumed: input.lowWaterElevationFt === undefined && input.drawdownFt === undefined,
    topElevationFt,
    toeElevationFt,
    toeGovernedBy: byDrinking < byPool ? 'low water - drinking depth' : 'full pool - toe depth',
    drinkingDepthAtLowWaterFt,
    waterSurfaceTodayFt:
      waterSurfaceTodayFt === undefined
        ? undefined
        : requireNumber({ field: 'waterSurfaceTodayFt', value: waterSurfaceTodayFt }),
  }
}

function lowWater(input: RampProfileInput, fullPoolElevationFt: number): number {
  const { lowWaterElevationFt, drawdownFt = ASSUMED_DRAWDOWN_FT } = input
  if (lowWaterElevationFt === undefined) {
    return fullPoolElevationFt - requireNumber({ field: 'drawdownFt', value: drawdownFt, min: 0 })
  }
  return requireNumber({ field: 'lowWaterElevationFt', value: lowWaterElevationFt, max: fullPoolElevationFt })
}
