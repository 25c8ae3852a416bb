import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { findSelfCrossing } from './find-self-crossing.js'
import { legAzimuthDeg } from './leg-azimuth-deg.js'
import { type PlanPoint, signedAreaFt2 } from './signed-area.js'
import { FT2_PER_ACRE } from '../unit-factors.js'

export interface TraverseLeg {
  azimuthDeg?: number
  /** Quadrant bearing: N or S, degrees, minutes and seconds as wanted, E or W. */
  bearing?: string
  distanceFt: number
}

export interface TraverseInput {
  legs: readonly TraverseLeg[]
  /** Magnetic declination, degrees, east positive; added to every azimuth and shown. */
  declinationDeg?: number
}

export interface Traverse {
  /** Start and the end of every leg but the last. */
  points: PlanPoint[]
  areaFt2: number
  areaAcres: number
  perimeterFt: number
  closureErrorFt: number
  /** n of "1 in n"; absent when the traverse closes exactly. */
  closureRatio?: number
  declinationDeg: number
}

/** Sines of round angles leave this much behind on legs of any farm's length. */
const EXACT_FT = 1e-6

/**
 * Closed compass and tape traverse: east = Σ d · sin α, north = Σ d · cos α; area by the shoelace over the points,
 * closed from the last back to the first; closure ratio = perimeter / closure error.
 *
 * @param input.legs 3 or more, distances in ft > 0, azimuth 0–360 degrees or bearing `N 45 30 E`. A bare bearing
 *   number is refused, since 45 may mean four directions.
 * @param input.declinationDeg −180 to 180, 0 unless given.
 * @returns points from 0, 0 (ft), area (ft² and acres), perimeter (ft), closure error (ft) and ratio.
 * @throws EngineeringInputError naming the leg; also for a traverse that crosses itself.
 * @see common practice, no source (latitudes and departures, shoelace).
 * @example traverse({ legs: [{ bearing: 'N 0 E', distanceFt: 150 }, { azimuthDeg: 90, distanceFt: 250 },
 *   { bearing: 'S 0 E', distanceFt: 150 }, { azimuthDeg: 270, distanceFt: 250 }] }).areaFt2 // 37500
 */
export function traverse({ legs, declinationDeg = 0 }: TraverseInput): Traverse {
  if (!Array.isArray(legs) || legs.length < 3) {
    throw new EngineeringInputError({ field: 'legs', message: 'A traverse needs at least three legs.' })
  }
  const declination = requireNumber({ field: 'declinationDeg', value: declinationDeg, min: -180, max: 180 })
  const points: PlanPoint[] = [{ eastFt: 0, northFt: 0 }]
  let perimeterFt = 0
  let end: PlanPoint = { eastFt: 0, northFt: 0 }
  legs.forEach((leg: TraverseLeg, index) => {
    const distanceFt = requireNumber({
      field: `legs[${index}].distanceFt`,
      value: leg.distanceFt,
      exclusiveMin: 0,
    })
    const azimuth = ((legAzimuthDeg({ leg, index }) + declination) * Math.PI) / 180
    end = {
      eastFt: end.eastFt + distanceFt * Math.sin(azimuth),
      northFt: end.northFt + distanceFt * Math.cos(azimuth),
    }
    perimeterFt += distanceFt
    if (index < legs.length - 1) points.push(end)
  })
  refuseCrossing(points)
  const areaFt2 = Math.abs(signedAreaFt2(points))
  const error = Math.hypot(end.eastFt, end.northFt)
  const closureErrorFt = error < EXACT_FT ? 0 : error
  const ratio = closureErrorFt > 0 ? { closureRatio: perimeterFt / closureErrorFt } : {}
  return {
    points,
    areaFt2,
    areaAcres: areaFt2 / FT2_PER_ACRE,
    perimeterFt,
    closureErrorFt,
    ...ratio,
    declinationDeg: declination,
  }
}

function refuseCrossing(points: PlanPoint[]): void {
  const crossing = findSelfCrossing(points)
  if (!crossing) return
  throw new EngineeringInputError({
    field: 'legs',
    message: `Leg ${crossing.first} crosses leg ${crossing.second}; a traverse must not cross itself.`,
  })
}
