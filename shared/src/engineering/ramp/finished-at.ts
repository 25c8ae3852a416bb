import type { Stretch } from './stretches.js'

/** Finished elevation of a stretch at a station, ft. */
export function finishedAt(stretch: Stretch, stationFt: number): number {
  return stretch.finishedAtFromFt + stretch.risePerFt * (stationFt - stretch.fromFt)
}
