import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import { stationAtElevation } from './station-at-elevation.js'

interface CrossingInput {
  groundLine: readonly GroundPoint[]
  fullPoolElevationFt: number
}

export interface FullPoolCrossing {
  /** Index of the ground point on the land side of the crossing. */
  landIndex: number
  stationFt: number
}

/** Where the ground falls through full pool, nearest the water end of the line. */
export function fullPoolCrossing({ groundLine, fullPoolElevationFt }: CrossingInput): FullPoolCrossing {
  for (let index = groundLine.length - 2; index >= 0; index -= 1) {
    const [land, water] = [groundLine[index], groundLine[index + 1]]
    if (land === undefined || water === undefined) continue
    if (land.elevationFt < fullPoolElevationFt || water.elevationFt > fullPoolElevationFt) continue
    if (land.elevationFt === water.elevationFt) continue
    return {
      landIndex: index,
      stationFt: stationAtElevation({ land, water, elevationFt: fullPoolElevationFt }),
    }
  }
  throw new EngineeringInputError({
    field: 'groundLine',
    message: `The ground line never falls to full pool at ${forWords(fullPoolElevationFt)} ft; survey on into the water.`,
  })
}
