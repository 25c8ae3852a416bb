import { bracketedRoot } from '../berm/bracketed-root.js'
import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { resolveGroundLine } from '../survey/resolve-ground-line.js'
import { fullPoolCrossing } from './full-pool-crossing.js'
import { earthworkTemplate, type EarthworkTemplateInput } from './earthwork-template.js'
import { addVolumes } from './add-volumes.js'
import { measureRamp } from './measure-ramp.js'
import { profileOn } from './profile-on.js'
import type { RampProfileInput } from './ramp-profile.js'

export interface BalancedTopStationInput {
  /** Input of rampProfile; its `rampTopStationFt` does not count here. */
  profile: RampProfileInput
  earthwork: EarthworkTemplateInput
  shrinkPercent: number
}

const STEPS_TRIED = 16
/** Finer than a stake can be set. */
const TOLERANCE_FT = 1e-4

/**
 * Top station at which the ramp feeds its own fill: dry cut · (1 − shrink) = fill, its ends included, by exact volumes.
 * Searched from the water's edge (the ground's full-pool crossing) landward to the first ground point; the first
 * change of sign counts.
 *
 * @param input.profile, input.earthwork as for rampProfile and rampEarthwork; input.shrinkPercent 0 to < 100.
 * @returns station, ft, or undefined when no station on the survey balances.
 * @throws EngineeringInputError for inputs that are wrong at every station.
 * @see common practice, no source.
 * @example balancedTopStationFt({ profile: profileInput, earthwork: earthworkInput, shrinkPercent: 10 })
 */
export function balancedTopStationFt({
  profile,
  earthwork,
  shrinkPercent,
}: BalancedTopStationInput): number | undefined {
  const shrink =
    requireNumber({ field: 'shrinkPercent', value: shrinkPercent, min: 0, exclusiveMax: 100 }) / 100
  const template = earthworkTemplate(earthwork)
  const waterSurfaceFt = profile.waterSurfaceTodayFt
  const groundLine = resolveGroundLine({ groundLine: profile.groundLine, waterSurfaceFt })
  const landFt = groundLine[0]?.stationFt ?? 0
  const { stationFt: edgeFt } = fullPoolCrossing({
    groundLine,
    fullPoolElevationFt: profile.fullPoolElevationFt,
  })
  const surplusAt = (topStationFt: number): number | undefined =>
    whereSurveyReaches(() => {
      const { surface } = profileOn({ input: profile, groundLine, topStationFt })
      const pieces = measureRamp({ groundLine, surface, template, intervalFt: Infinity })
      const { dryCutYd3, fillYd3 } = addVolumes(pieces.map(({ prismoidal }) => prismoidal))
      return fillYd3 - dryCutYd3 * (1 - shrink)
    })
  let water = { stationFt: edgeFt, surplus: surplusAt(edgeFt) }
  for (let step = 1; step <= STEPS_TRIED; step += 1) {
    const stationFt = edgeFt - ((edgeFt - landFt) * step) / STEPS_TRIED
    const land = { stationFt, surplus: surplusAt(stationFt) }
    if (water.surplus !== undefined && land.surplus !== undefined && water.surplus * land.surplus <= 0) {
      const rising = Math.sign(water.surplus - land.surplus)
      const f = (top: number) => rising * (surplusAt(top) ?? 0)
      return bracketedRoot({ f, low: land.stationFt, high: water.stationFt, tolerance: TOLERANCE_FT })
    }
    water = land
  }
  return undefined
}

/** A station whose ramp runs off the survey is no answer; any other error is the caller's to see. */
function whereSurveyReaches(reckon: () => number): number | undefined {
  try {
    return reckon()
  } catch (error) {
    if (error instanceof EngineeringInputError && error.field === 'groundLine') return undefined
    throw error
  }
}
