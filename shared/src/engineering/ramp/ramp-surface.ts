import type { RampPart } from '../design/ramp-shapes.js'
import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { meetGround } from './meet-ground.js'
import { surveyReachError } from './survey-reach-error.js'

/** `part` is the part that runs from this point toward the water; the last point repeats the part that ends there. */
export interface SurfacePoint {
  stationFt: number
  elevationFt: number
  part: RampPart
}

export interface SurfaceInput {
  groundLine: readonly GroundPoint[]
  topStationFt: number
  topElevationFt: number
  toeElevationFt: number
  gradeRunPerRise: number
  landingLengthFt: number
  apronLengthFt: number
  approachGradeRunPerRise: number
}

/** Nearer than this the ground is taken to be at the ramp's top already. */
const NO_STEP_FT = 0.05

/** Finished surface from the end of the approach to the end of the apron. */
export function rampSurface(input: SurfaceInput): SurfacePoint[] {
  const { topStationFt, topElevationFt, toeElevationFt, landingLengthFt, apronLengthFt } = input
  const toeStationFt = topStationFt + (topElevationFt - toeElevationFt) * input.gradeRunPerRise
  const landward = { stationFt: topStationFt - landingLengthFt, elevationFt: topElevationFt }
  const end = { stationFt: toeStationFt + apronLengthFt, elevationFt: toeElevationFt }
  requireReach({ groundLine: input.groundLine, landward, end })
  const lastPart: RampPart = apronLengthFt > 0 ? 'apron' : 'ramp'
  return [
    ...approachStart({ ...input, landward }),
    ...(landingLengthFt > 0 ? [{ ...landward, part: 'landing' as const }] : []),
    { stationFt: topStationFt, elevationFt: topElevationFt, part: 'ramp' },
    { stationFt: toeStationFt, elevationFt: toeElevationFt, part: lastPart },
    ...(apronLengthFt > 0 ? [{ ...end, part: lastPart }] : []),
  ]
}

/** Earth approach from the ramp's top up or down to the ground; its rock is the pad's and is counted there. */
function approachStart(input: SurfaceInput & { landward: GroundPoint }): SurfacePoint[] {
  const { groundLine, landward, approachGradeRunPerRise } = input
  const stepFt = interpolateGround(groundLine, landward.stationFt) - landward.elevationFt
  if (Math.abs(stepFt) <= NO_STEP_FT) return []
  const risePerFt = Math.sign(stepFt) / approachGradeRunPerRise
  const meeting = meetGround({ groundLine, from: landward, risePerFt, toward: 'land' })
  if (!meeting.meets) {
    const stationFt = groundLine[0]?.stationFt ?? 0
    throw surveyReachError({ stationFt, neededStationFt: meeting.neededStationFt, toward: 'land' })
  }
  const { stationFt } = meeting
  return [{ stationFt, elevationFt: interpolateGround(groundLine, stationFt), part: 'approach' }]
}

function requireReach(given: {
  groundLine: readonly GroundPoint[]
  landward: GroundPoint
  end: GroundPoint
}): void {
  const first = given.groundLine[0]?.stationFt ?? 0
  const last = given.groundLine.at(-1)?.stationFt ?? 0
  const { landward, end } = given
  if (landward.stationFt < first || landward.stationFt > last) {
    throw new EngineeringInputError({
      field: 'rampTopStationFt',
      message: `The ramp begins at station ${forWords(landward.stationFt)}; it must lie on the survey, from ${forWords(first)} to ${forWords(last)}.`,
    })
  }
  if (end.stationFt > last + 1e-9) {
    throw surveyReachError({ stationFt: last, neededStationFt: end.stationFt, toward: 'water' })
  }
}
