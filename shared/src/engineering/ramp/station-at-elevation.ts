import type { GroundPoint } from '../survey/resolve-ground-line.js'

interface StationAtInput {
  land: GroundPoint
  water: GroundPoint
  elevationFt: number
}

/** Station on a falling piece of ground; on one that does not fall, its water end. */
export function stationAtElevation({ land, water, elevationFt }: StationAtInput): number {
  const fallFt = land.elevationFt - water.elevationFt
  if (fallFt <= 0) return water.stationFt
  return land.stationFt + ((land.elevationFt - elevationFt) / fallFt) * (water.stationFt - land.stationFt)
}
