import type { GroundPoint } from './resolve-ground-line.js'

/**
 * Elevation (ft) on a ground line that is already checked; a station past either end takes the end's elevation, so
 * callers check the reach first. Bisection, since a drawing asks for it hundreds of times.
 */
export function interpolateGround(groundLine: readonly GroundPoint[], stationFt: number): number {
  let low = 0
  let high = groundLine.length - 1
  while (high - low > 1) {
    const middle = (low + high) >> 1
    if ((groundLine[middle] as GroundPoint).stationFt <= stationFt) low = middle
    else high = middle
  }
  const left = groundLine[low] as GroundPoint
  const right = groundLine[high] as GroundPoint
  if (stationFt <= left.stationFt) return left.elevationFt
  if (stationFt >= right.stationFt) return right.elevationFt
  const share = (stationFt - left.stationFt) / (right.stationFt - left.stationFt)
  return left.elevationFt + share * (right.elevationFt - left.elevationFt)
}
