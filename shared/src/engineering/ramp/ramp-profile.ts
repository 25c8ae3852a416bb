import type { ProfileValue } from '../design/ramp-shapes.js'
import { type GroundPointInput, resolveGroundLine } from '../survey/resolve-ground-line.js'
import { profileOn } from './profile-on.js'
import type { RampLevels } from './ramp-levels.js'
import type { SurfacePoint } from './ramp-surface.js'
import type { WaterEdges } from './water-edges.js'

export interface RampProfileInput {
  groundLine: readonly GroundPointInput[]
  fullPoolElevationFt: number
  lowWaterElevationFt?: number
  /** Fall of the water below full pool; used when low water itself is not known. */
  drawdownFt?: number
  topAboveFullPoolFt: number
  toeBelowFullPoolFt: number
  drinkingDepthAtLowWaterFt: number
  gradeRunPerRise: number
  rampTopStationFt?: number
  apronLengthFt?: number
  landingLengthFt?: number
  approachGradeRunPerRise?: number
  /** Level expected while building. */
  waterSurfaceTodayFt?: number
  floodPoolElevationFt?: number
  topOfDamElevationFt?: number
}

export interface RampProfile
  extends Omit<ProfileValue, keyof RampLevels | 'surface'>, WaterEdges, RampLevels {
  gradeRunPerRise: number
  cosTheta: number
  surface: SurfacePoint[]
  /** End of the apron, or the toe. */
  endStationFt: number
  /** Slope, apron and landing: the length that carries rock and fabric. */
  rockedLengthFt: number
  /** Toe less bed: negative in a pit, positive hanging above the bed. */
  toeMinusGroundFt: number
  topAboveFloodPoolFt?: number
  topBelowDamFt?: number
}

/**
 * Long section of the ramp. top = full pool + topAboveFullPool; toe = min(full pool − toeBelowFullPool, low water −
 * drinking depth); run = (top − toe) · grade; slope length = √(run² + rise²). The top stands where the ground, walked
 * landward from its full-pool crossing, first reaches the top elevation, unless a station is given; where the ground
 * there is off by more than 0.05 ft an earth approach joins them.
 *
 * @param input.groundLine 2 or more points, ft, stations strictly ascending toward the water; soundings as
 *   `waterDepthFt` below waterSurfaceTodayFt.
 * @param input.fullPoolElevationFt ft; lowWaterElevationFt ft, not above it, or drawdownFt ft ≥ 0 (4 ft assumed when
 *   both are missing).
 * @param input.topAboveFullPoolFt, toeBelowFullPoolFt, drinkingDepthAtLowWaterFt ft ≥ 0; gradeRunPerRise > 0.
 * @param input.rampTopStationFt ft, on the survey; apronLengthFt and landingLengthFt ft ≥ 0, 0 unless given;
 *   approachGradeRunPerRise > 0, 10 unless given (district setting).
 * @param input.waterSurfaceTodayFt, floodPoolElevationFt, topOfDamElevationFt ft, optional.
 * @returns elevations and stations (ft), run, rise, slope length (ft), grade (percent, degrees), finished surface, water
 *   edges and wetted lengths (ft), fall of level that is served (ft), ground at both ends, bank case.
 * @throws EngineeringInputError: `topAboveFullPoolFt` when the ground never rises to the top, `groundLine` when it never
 *   falls to full pool or the survey is too short, else the field itself.
 * @see depth and fall: K-State, George & Murphy, "Construction of a Limited Access Ramp for Pond Watering of Cattle",
 *   undated; grade: K-State, Livestock Watering Handbook, "Limited Access", undated; geometry: common practice.
 * @example rampProfile({ groundLine, fullPoolElevationFt: 100, lowWaterElevationFt: 96, topAboveFullPoolFt: 1.5,
 *   toeBelowFullPoolFt: 3, drinkingDepthAtLowWaterFt: 1.5, gradeRunPerRise: 8 }).toeElevationFt // 94.5
 */
export function rampProfile(input: RampProfileInput): RampProfile {
  const groundLine = resolveGroundLine({
    groundLine: input.groundLine,
    waterSurfaceFt: input.waterSurfaceTodayFt,
  })
  return profileOn({ input, groundLine, topStationFt: input.rampTopStationFt })
}
