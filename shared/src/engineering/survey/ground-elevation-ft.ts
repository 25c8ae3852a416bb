import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'
import { interpolateGround } from './interpolate-ground.js'
import { type GroundPointInput, resolveGroundLine } from './resolve-ground-line.js'

export interface GroundElevationInput {
  groundLine: readonly GroundPointInput[]
  stationFt: number
  waterSurfaceFt?: number
}

/**
 * Ground elevation at a station: z = z1 + (s − s1)(z2 − z1)/(s2 − s1).
 *
 * @param input.groundLine 2 or more points, ft, stations strictly ascending toward the water.
 * @param input.stationFt station asked for, ft, between the first and the last point.
 * @param input.waterSurfaceFt ft, only for points given as `waterDepthFt`.
 * @returns elevation, ft.
 * @throws EngineeringInputError naming `groundLine` for a bad line, `stationFt` for a station beyond its reach.
 * @see common practice, no source (straight ground between shots).
 * @example groundElevationFt({ groundLine: [{ stationFt: 0, elevationFt: 10 }, { stationFt: 10, elevationFt: 8 }],
 *   stationFt: 5 }) // 9
 */
export function groundElevationFt({ groundLine, stationFt, waterSurfaceFt }: GroundElevationInput): number {
  const line = resolveGroundLine({ groundLine, waterSurfaceFt })
  const station = requireNumber({ field: 'stationFt', value: stationFt })
  const first = line[0]?.stationFt ?? station
  const last = line.at(-1)?.stationFt ?? station
  if (station < first || station > last) {
    throw new EngineeringInputError({
      field: 'stationFt',
      message: `Station ${forWords(station)} lies outside the survey, which runs from ${forWords(first)} to ${forWords(last)}.`,
    })
  }
  return interpolateGround(line, station)
}
