import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'

export interface GroundPoint {
  stationFt: number
  elevationFt: number
}

/** A rod shot has an elevation; a sounding from a boat has the depth of water over the bed instead. */
export interface GroundPointInput {
  stationFt: number
  elevationFt?: number
  waterDepthFt?: number
}

export interface ResolveGroundLineInput {
  groundLine: readonly GroundPointInput[]
  /** Level that the soundings were taken from. Needed only when a point has `waterDepthFt`. */
  waterSurfaceFt?: number
}

const BANK_SENTENCE =
  'A cut bank is entered with its foot at least 0.1 ft farther than its lip, and stations must grow toward the water.'

/**
 * Ground line with an elevation at every point: bed elevation = water surface − water depth.
 *
 * @param input.groundLine 2 or more points, stations (ft, any sign) strictly ascending toward the water; each has
 *   either `elevationFt` (ft) or `waterDepthFt` (ft, 0 or more).
 * @param input.waterSurfaceFt water surface of the day of the soundings, ft.
 * @returns points `{ stationFt, elevationFt }`, ft.
 * @throws EngineeringInputError for fewer than two points, equal or descending stations, a point with neither or
 *   both figures, or a sounding without a water surface.
 * @see common practice, no source (soundings reduced from the water surface).
 * @example resolveGroundLine({ groundLine: [{ stationFt: 0, elevationFt: 100 }, { stationFt: 9, waterDepthFt: 2 }],
 *   waterSurfaceFt: 98.6 }) // second point at 96.6
 */
export function resolveGroundLine({ groundLine, waterSurfaceFt }: ResolveGroundLineInput): GroundPoint[] {
  if (!Array.isArray(groundLine) || groundLine.length < 2) {
    const found = Array.isArray(groundLine) ? groundLine.length : 0
    throw new EngineeringInputError({
      field: 'groundLine',
      message: `The ground line has ${found} point${found === 1 ? '' : 's'}; it needs at least two.`,
    })
  }
  let before = -Infinity
  return groundLine.map((point: GroundPointInput, index) => {
    const field = `groundLine[${index}]`
    const stationFt = requireNumber({ field: `${field}.stationFt`, value: point?.stationFt })
    if (stationFt <= before)
      throw new EngineeringInputError({ field: 'groundLine', message: order(before, stationFt) })
    before = stationFt
    return { stationFt, elevationFt: pointElevation({ point, field, waterSurfaceFt }) }
  })
}

function order(before: number, stationFt: number): string {
  return `Station ${forWords(stationFt)} follows station ${forWords(before)}. ${BANK_SENTENCE}`
}

function pointElevation(given: {
  point: GroundPointInput
  field: string
  waterSurfaceFt: number | undefined
}): number {
  const { point, field } = given
  if (point.waterDepthFt === undefined) {
    return requireNumber({ field: `${field}.elevationFt`, value: point.elevationFt })
  }
  if (point.elevationFt !== undefined) {
    throw new EngineeringInputError({
      field,
      message: `${field} has an elevation and a water depth; it must have one of them.`,
    })
  }
  const depthFt = requireNumber({ field: `${field}.waterDepthFt`, value: point.waterDepthFt, min: 0 })
  return requireNumber({ field: 'waterSurfaceFt', value: given.waterSurfaceFt }) - depthFt
}
