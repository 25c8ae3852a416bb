import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { TraverseLeg } from './traverse.js'

const BEARING =
  /^([NS])\s*(\d{1,3}(?:\.\d+)?)[°\s]*(?:(\d{1,2}(?:\.\d+)?)['′\s]*)?(?:(\d{1,2}(?:\.\d+)?)["″\s]*)?([EW])$/i

/** Degrees clockwise from north for a bearing in its quadrant, by the two letters of the bearing. */
const QUADRANTS: Readonly<Record<string, (angle: number) => number>> = {
  NE: (angle) => angle,
  SE: (angle) => 180 - angle,
  SW: (angle) => 180 + angle,
  NW: (angle) => 360 - angle,
}

/** Azimuth of a leg in degrees, from `azimuthDeg` (0–360) or a bearing such as `N 45 30 E`. */
export function legAzimuthDeg({ leg, index }: { leg: TraverseLeg; index: number }): number {
  if (leg.bearing === undefined) {
    return requireNumber({ field: `legs[${index}].azimuthDeg`, value: leg.azimuthDeg, min: 0, max: 360 })
  }
  if (leg.azimuthDeg !== undefined) {
    return refuse(index, 'the leg has a bearing and an azimuth; it must have one of them')
  }
  const parts = typeof leg.bearing === 'string' ? BEARING.exec(leg.bearing.trim()) : null
  const [, northSouth = '', degrees = '0', minutes = '0', seconds = '0', eastWest = ''] = parts ?? []
  const angle = Number(degrees) + Number(minutes) / 60 + Number(seconds) / 3600
  const quadrant = QUADRANTS[`${northSouth}${eastWest}`.toUpperCase()]
  if (!quadrant || angle > 90 || Number(minutes) >= 60 || Number(seconds) >= 60) {
    return refuse(index, `"${leg.bearing}" is no bearing; write it as N 45 30 E, with 0 to 90 degrees`)
  }
  return quadrant(angle)
}

function refuse(index: number, sentence: string): never {
  throw new EngineeringInputError({
    field: `legs[${index}].bearing`,
    message: `Leg ${index + 1}: ${sentence}.`,
  })
}
