import type { RampProfile } from '../ramp/ramp-profile.js'
import type { GroundLinePoint } from '../design/design-input.js'

/**
 * Level at which water would run out of the pond along the ramp's axis: the highest point from the ramp's top
 * landward, on the finished surface where there is one and on the ground elsewhere. Water that stands lower is kept in.
 */
export function rimElevationFt({
  profile,
  groundLine,
}: {
  profile: Pick<RampProfile, 'surface' | 'topStationFt'>
  groundLine: readonly GroundLinePoint[]
}): number {
  const landward = profile.surface.filter(({ stationFt }) => stationFt <= profile.topStationFt)
  const finishedFrom = Math.min(...landward.map(({ stationFt }) => stationFt))
  const natural = groundLine.filter(({ stationFt }) => stationFt <= finishedFrom)
  return Math.max(...[...landward, ...natural].map(({ elevationFt }) => elevationFt))
}
