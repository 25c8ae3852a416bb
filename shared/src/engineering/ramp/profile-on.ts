import { requireNumber } from '../require-number.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { bankCase } from './bank-case.js'
import { defaultTopStation } from './default-top-station.js'
import { rampLevels } from './ramp-levels.js'
import type { RampProfile, RampProfileInput } from './ramp-profile.js'
import { rampSurface } from './ramp-surface.js'
import { waterEdges } from './water-edges.js'

const DEFAULT_APPROACH_GRADE = 10

interface ProfileOnInput {
  input: RampProfileInput
  groundLine: readonly GroundPoint[]
  topStationFt: number | undefined
}

/** rampProfile on a ground line that is already checked, for callers that try many top stations. */
export function profileOn({ input, groundLine, topStationFt: givenTop }: ProfileOnInput): RampProfile {
  const levels = rampLevels(input)
  const shape = rampShape(input)
  const { topElevationFt, toeElevationFt, fullPoolElevationFt } = levels
  const topStationFt =
    givenTop === undefined
      ? defaultTopStation({ groundLine, fullPoolElevationFt, topElevationFt })
      : requireNumber({ field: 'rampTopStationFt', value: givenTop })
  const surface = rampSurface({ ...shape, groundLine, topStationFt, topElevationFt, toeElevationFt })
  const riseFt = topElevationFt - toeElevationFt
  const runFt = riseFt * shape.gradeRunPerRise
  const slopeLengthFt = Math.hypot(runFt, riseFt)
  const toeStationFt = topStationFt + runFt
  const endStationFt = toeStationFt + shape.apronLengthFt
  const groundAtToeFt = interpolateGround(groundLine, endStationFt)
  return {
    ...levels,
    ...aboveOtherLevels({ input, topElevationFt }),
    topStationFt,
    toeStationFt,
    endStationFt,
    riseFt,
    runFt,
    slopeLengthFt,
    rockedLengthFt: slopeLengthFt + shape.apronLengthFt + shape.landingLengthFt,
    gradeRunPerRise: shape.gradeRunPerRise,
    gradePercent: 100 / shape.gradeRunPerRise,
    gradeDegrees: (Math.atan(1 / shape.gradeRunPerRise) * 180) / Math.PI,
    cosTheta: runFt / slopeLengthFt,
    surface,
    ...waterEdges({
      levels,
      topStationFt,
      toeStationFt,
      endStationFt,
      gradeRunPerRise: shape.gradeRunPerRise,
    }),
    drawdownServedFt: fullPoolElevationFt - (toeElevationFt + levels.drinkingDepthAtLowWaterFt),
    groundAtTopFt: interpolateGround(groundLine, topStationFt),
    groundAtToeFt,
    toeMinusGroundFt: toeElevationFt - groundAtToeFt,
    bankCase: bankCase({ groundLine, surface }),
  }
}

function rampShape(input: RampProfileInput) {
  const { apronLengthFt = 0, landingLengthFt = 0, approachGradeRunPerRise = DEFAULT_APPROACH_GRADE } = input
  return {
    gradeRunPerRise: requireNumber({
      field: 'gradeRunPerRise',
      value: input.gradeRunPerRise,
      exclusiveMin: 0,
    }),
    apronLengthFt: requireNumber({ field: 'apronLengthFt', value: apronLengthFt, min: 0 }),
    landingLengthFt: requireNumber({ field: 'landingLengthFt', value: landingLengthFt, min: 0 }),
    approachGradeRunPerRise: requireNumber({
      field: 'approachGradeRunPerRise',
      value: approachGradeRunPerRise,
      exclusiveMin: 0,
    }),
  }
}

function aboveOtherLevels(given: { input: RampProfileInput; topElevationFt: number }) {
  const { floodPoolElevationFt: flood, topOfDamElevationFt: dam } = given.input
  const number = (field: string, value: number) => requireNumber({ field, value })
  return {
    ...(flood === undefined
      ? {}
      : { topAboveFloodPoolFt: given.topElevationFt - number('floodPoolElevationFt', flood) }),
    ...(dam === undefined
      ? {}
      : { topBelowDamFt: number('topOfDamElevationFt', dam) - given.topElevationFt }),
  }
}
