import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { fullPoolCrossing } from './full-pool-crossing.js'
import { stationAtElevation } from './station-at-elevation.js'

interface TopStationInput {
  groundLine: readonly GroundPoint[]
  fullPoolElevationFt: number
  topElevationFt: number
}

/**
 * From the full-pool crossing nearest the water end landward to the first ground at the top elevation. Walked from the
 * water, since a rut or an old trail farther landward may fall to that elevation first.
 */
export function defaultTopStation({
  groundLine,
  fullPoolElevationFt,
  topElevationFt,
}: TopStationInput): number {
  const { landIndex } = fullPoolCrossing({ groundLine, fullPoolElevationFt })
  for (let index = landIndex; index >= 0; index -= 1) {
    const [land, water] = [groundLine[index], groundLine[index + 1]]
    if (land === undefined || water === undefined || land.elevationFt < topElevationFt) continue
    return stationAtElevation({ land, water, elevationFt: topElevationFt })
  }
  const highest = groundLine
    .slice(0, landIndex + 1)
    .reduce((best, point) => (point.elevationFt > best.elevationFt ? point : best))
  throw new EngineeringInputError({
    field: 'topAboveFullPoolFt',
    message:
      `The ground rises only to ${forWords(highest.elevationFt)} ft at station ${forWords(highest.stationFt)}, ` +
      `below the ramp top at ${forWords(topElevationFt)} ft. Build the top in fill and enter its station, or lower the top.`,
  })
}
