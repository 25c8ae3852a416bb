import type { ClosingPanelValue } from '../design/part-shapes.js'
import { requireNumber } from '../require-number.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import { type GroundPointInput, resolveGroundLine } from '../survey/resolve-ground-line.js'
import type { RampProfile } from './ramp-profile.js'
import { surveyReachError } from './survey-reach-error.js'

export interface ClosingPanelInput {
  profile: Pick<
    RampProfile,
    'fullPoolElevationFt' | 'fullPoolEdgeStationFt' | 'endStationFt' | 'toeElevationFt'
  >
  widthFt: number
  /** Between the ramp's edge and the panel, each side. */
  clearFt: number
  /** From the toe (or the end of the apron) out to the panel. */
  beyondToeFt: number
  aboveWaterFt: number
  postSpacingFt: number
  /** Bed beyond the toe; without it the bed is taken at the toe's elevation. */
  groundLine?: readonly GroundPointInput[]
  /** Only for ground points given as `waterDepthFt`. */
  waterSurfaceTodayFt?: number
  /** Deeper than this the panel floats instead of standing on posts. */
  floatBeyondDepthFt?: number
}

export interface ClosingPanel extends ClosingPanelValue {
  pullsFt: { side: number; end: number }
  linePosts: number
  cornerPosts: number
  endPosts: number
  support: 'posts' | 'float'
}

/** Kerr Center (Oklahoma), pond watering points: a floating fence stands where the water is at least 5 ft deep. */
const DEFAULT_FLOAT_DEPTH_FT = 5

/**
 * Panel in the water that closes the ramp off: two sides from the full-pool edge of the finished surface to beyond the
 * toe, and one across. length = 2(toe + beyond − full-pool edge) + width + 2 · clear; height at the deepest post =
 * depth there at full pool + above water; posts = two ends, two corners and ceil(pull/spacing) − 1 in each pull.
 * It is never energized.
 *
 * @param input.profile result of rampProfile; widthFt ft > 0; clearFt, beyondToeFt, aboveWaterFt ft ≥ 0; postSpacingFt
 *   ft > 0; groundLine if the bed beyond the toe is known; floatBeyondDepthFt ft > 0, 5 unless given.
 * @returns length, depth and height (ft), posts by kind, and whether it stands on posts or floats.
 * @throws EngineeringInputError naming the field.
 * @see depth: Kerr Center (Oklahoma), pond watering points, 2011; layout: common practice, no source.
 * @example closingPanel({ profile, widthFt: 18, clearFt: 1, beyondToeFt: 3, aboveWaterFt: 2, postSpacingFt: 10 }).lengthFt
 */
export function closingPanel(input: ClosingPanelInput): ClosingPanel {
  const { profile, floatBeyondDepthFt = DEFAULT_FLOAT_DEPTH_FT } = input
  const positive = (field: string, value: number) => requireNumber({ field, value, exclusiveMin: 0 })
  const atLeastZero = (field: string, value: number) => requireNumber({ field, value, min: 0 })
  const panelStationFt = profile.endStationFt + atLeastZero('beyondToeFt', input.beyondToeFt)
  const side = panelStationFt - profile.fullPoolEdgeStationFt
  const end = positive('widthFt', input.widthFt) + 2 * atLeastZero('clearFt', input.clearFt)
  const spacingFt = positive('postSpacingFt', input.postSpacingFt)
  const linePostsIn = (pullFt: number) => Math.max(0, Math.ceil(pullFt / spacingFt - 1e-9) - 1)
  const linePosts = 2 * linePostsIn(side) + linePostsIn(end)
  const deepestWaterFt =
    profile.fullPoolElevationFt - Math.min(profile.toeElevationFt, bedAt(input, panelStationFt))
  const limitFt = positive('floatBeyondDepthFt', floatBeyondDepthFt)
  return {
    lengthFt: 2 * side + end,
    pullsFt: { side, end },
    deepestWaterFt,
    heightAtDeepestPostFt: deepestWaterFt + atLeastZero('aboveWaterFt', input.aboveWaterFt),
    linePosts,
    cornerPosts: 2,
    endPosts: 2,
    posts: linePosts + 4,
    support: deepestWaterFt > limitFt ? 'float' : 'posts',
  }
}

function bedAt({ groundLine, waterSurfaceTodayFt, profile }: ClosingPanelInput, stationFt: number): number {
  if (groundLine === undefined) return profile.toeElevationFt
  const line = resolveGroundLine({ groundLine, waterSurfaceFt: waterSurfaceTodayFt })
  const last = line.at(-1)?.stationFt ?? 0
  if (stationFt > last)
    throw surveyReachError({ stationFt: last, neededStationFt: stationFt, toward: 'water' })
  return interpolateGround(line, stationFt)
}
