/// <reference types="./geographiclib-geodesic.d.ts" />
import geodesic from 'geographiclib-geodesic'
import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { findSelfCrossing } from './find-self-crossing.js'
import type { PlanPoint } from './signed-area.js'
import { FT2_PER_ACRE } from '../unit-factors.js'

export interface TrackPosition {
  lat: number
  lon: number
}

export interface TrackOutline {
  areaAcres: number
  areaFt2: number
  perimeterFt: number
  pointsFt: PlanPoint[]
}

const METRES_PER_FOOT = 0.3048
const { WGS84 } = geodesic.Geodesic

/**
 * Area and perimeter of a walked outline on the WGS84 ellipsoid, and its points in local feet for drawing.
 * Local feet: distance and direction of the geodesic from the first position, east = s · sin α, north = s · cos α.
 *
 * @param input.positions open or closed ring, degrees, lat −90 to 90, lon −180 to 180; at least 3 distinct ones.
 * @returns areaAcres and areaFt2 (without sign), perimeterFt (international feet), pointsFt with the first at 0, 0.
 * @throws EngineeringInputError naming `positions` for fewer than three distinct positions, for positions on one line,
 *   and for an outline that crosses itself (the two legs are named).
 * @see C. F. F. Karney, Algorithms for geodesics, Journal of Geodesy 87, 43–55 (2013).
 * @example outlineFromTrack({ positions: [{ lat: 40, lon: -90 }, { lat: 40, lon: -89.999 },
 *   { lat: 40.0005, lon: -89.999 }] }).areaAcres
 */
export function outlineFromTrack({ positions }: { positions: readonly TrackPosition[] }): TrackOutline {
  const ring = distinctRing(positions)
  const origin = ring[0]
  if (origin === undefined || ring.length < 3) {
    return refuse(`The track has ${ring.length} distinct positions; an outline needs at least three.`)
  }
  const pointsFt = ring.map((position) => localFeet({ origin, position }))
  const crossing = findSelfCrossing(pointsFt)
  if (crossing) {
    return refuse(
      `Leg ${crossing.first} of the track crosses leg ${crossing.second}; an outline must not cross itself.`,
    )
  }
  const polygon = WGS84.Polygon(false)
  for (const { lat, lon } of ring) polygon.AddPoint(lat, lon)
  const { area, perimeter } = polygon.Compute(false, true)
  const areaFt2 = Math.abs(area) / METRES_PER_FOOT ** 2
  if (areaFt2 < 1)
    return refuse('All positions of the track lie on one line; an outline must enclose an area.')
  return { areaAcres: areaFt2 / FT2_PER_ACRE, areaFt2, perimeterFt: perimeter / METRES_PER_FOOT, pointsFt }
}

/** A receiver writes the same position again while its carrier stands still, and a closed ring repeats its first. */
function distinctRing(positions: readonly TrackPosition[]): TrackPosition[] {
  if (!Array.isArray(positions)) return refuse('positions is missing; it must be a list of { lat, lon }.')
  const checked = positions.map((position: TrackPosition, index) => ({
    lat: requireNumber({ field: `positions[${index}].lat`, value: position?.lat, min: -90, max: 90 }),
    lon: requireNumber({ field: `positions[${index}].lon`, value: position?.lon, min: -180, max: 180 }),
  }))
  const moved = checked.filter((position, index) => index === 0 || !same(position, checked[index - 1]))
  const closed = moved.length > 1 && same(moved[0], moved.at(-1))
  return closed ? moved.slice(0, -1) : moved
}

function same(a: TrackPosition | undefined, b: TrackPosition | undefined): boolean {
  return a?.lat === b?.lat && a?.lon === b?.lon
}

function localFeet({ origin, position }: { origin: TrackPosition; position: TrackPosition }): PlanPoint {
  const line = WGS84.Inverse(origin.lat, origin.lon, position.lat, position.lon)
  const distanceFt = (line.s12 ?? 0) / METRES_PER_FOOT
  const azimuth = ((line.azi1 ?? 0) * Math.PI) / 180
  // + 0 turns the origin's -0 into 0
  return { eastFt: distanceFt * Math.sin(azimuth) + 0, northFt: distanceFt * Math.cos(azimuth) + 0 }
}

function refuse(message: string): never {
  throw new EngineeringInputError({ field: 'positions', message })
}
