import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { DesignPeakInput, RainfallIntensity, RationalPeakResult, Refused } from './design-peak-types.js'
import { logLogBetween } from './log-log-between.js'
import { rationalPeakCfs } from './rational-peak-cfs.js'

interface RationalAtTimeInput {
  areaAcres: number
  timeOfConcentrationHr: number
  rational: DesignPeakInput['rational']
}

const LEAST_DURATION_MIN = 5

/**
 * Rational peak with the intensity read at the time of concentration, never under 5 minutes,
 * straight between the given durations on log-log paper and never beyond them.
 *
 * @returns peakCfs in cfs with the intensity used, or `refused` when the durations do not reach Tc.
 * @throws EngineeringInputError naming rational or one of its fields.
 * Source: FHWA HEC-22, 4th ed., Feb 2024, ch. 4 (rain of a duration equal to Tc); the 5-minute floor is common practice.
 * @example rationalAtTime({ areaAcres: 1.8, timeOfConcentrationHr: 0.122, rational })
 */
export function rationalAtTime(input: RationalAtTimeInput): RationalPeakResult | Refused {
  if (!input.rational) {
    throw new EngineeringInputError({
      field: 'rational',
      message: 'rational is missing; the rational method needs a runoff coefficient and intensities.',
    })
  }
  const points = checkedPoints(input.rational.intensities)
  const raisedMin = Math.max(input.timeOfConcentrationHr * 60, LEAST_DURATION_MIN)
  const intensityInPerHr = logLogBetween(points, raisedMin)
  if (intensityInPerHr === undefined) {
    const reach = points.map(({ x }) => x)
    return {
      refused: `Rainfall intensities reach from ${reach[0]} to ${reach[reach.length - 1]} min; the rational method needs one at ${raisedMin.toFixed(1)} min.`,
    }
  }
  const { runoffCoefficient } = input.rational
  return {
    timeUsedHr: raisedMin / 60,
    intensityInPerHr,
    peakCfs: rationalPeakCfs({ runoffCoefficient, intensityInPerHr, areaAcres: input.areaAcres }),
    notes:
      input.timeOfConcentrationHr * 60 < LEAST_DURATION_MIN
        ? [
            `Time of concentration is below ${LEAST_DURATION_MIN} min; the ${LEAST_DURATION_MIN}-min intensity is used.`,
          ]
        : [],
  }
}

function checkedPoints(intensities: readonly RainfallIntensity[]) {
  if (intensities.length === 0) {
    throw new EngineeringInputError({
      field: 'rational.intensities',
      message: 'rational.intensities is empty; give at least one duration with its intensity.',
    })
  }
  return intensities.map((pair, index) => {
    const at = `rational.intensities[${index}]`
    const exclusiveMin = intensities[index - 1]?.durationMin ?? 0
    return {
      x: requireNumber({ field: `${at}.durationMin`, value: pair.durationMin, exclusiveMin, max: 1e5 }),
      y: requireNumber({
        field: `${at}.intensityInPerHr`,
        value: pair.intensityInPerHr,
        exclusiveMin: 0,
        max: 100,
      }),
    }
  })
}
