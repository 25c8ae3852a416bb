import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { limitsCrossed } from './limits-crossed.js'
import { methodLimits } from './method-limits.js'

export interface RationalPeakInput {
  /** Share of the rain that runs off C, greater than 0 and at most 1. */
  runoffCoefficient: number
  /** Rainfall intensity i over the time of concentration, in/h, 0 to 100. */
  intensityInPerHr: number
  /** Drainage area A, acres, greater than 0 and below 200. */
  areaAcres: number
}

/**
 * Peak discharge by the rational method: Q = C·i·A, with the factor 1 (1 acre-inch an hour is 1.008 cfs).
 *
 * @returns Q in cfs.
 * @throws EngineeringInputError naming the field, also for an area outside the method's limit of use.
 * Source: FHWA HEC-22, Urban Drainage Design Manual, 4th ed., Feb 2024, ch. 4, eq. 4.1.
 * @example rationalPeakCfs({ runoffCoefficient: 0.235, intensityInPerHr: 1.9, areaAcres: 43.3 }) // 19.33
 */
export function rationalPeakCfs(input: RationalPeakInput): number {
  const C = requireNumber({
    field: 'runoffCoefficient',
    value: input.runoffCoefficient,
    exclusiveMin: 0,
    max: 1,
  })
  const i = requireNumber({ field: 'intensityInPerHr', value: input.intensityInPerHr, min: 0, max: 100 })
  const A = requireNumber({ field: 'areaAcres', value: input.areaAcres, exclusiveMin: 0 })
  const [crossed] = limitsCrossed({ method: 'rational', values: { areaAcres: A }, limits: methodLimits })
  if (crossed) throw new EngineeringInputError({ field: crossed.field, message: crossed.sentence })
  return C * i * A
}
