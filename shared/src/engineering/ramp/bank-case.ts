import { interpolateGround } from '../survey/interpolate-ground.js'
import type { GroundPoint } from '../survey/resolve-ground-line.js'
import type { SurfacePoint } from './ramp-surface.js'

/** A finished surface this near the ground is neither cut nor fill. */
const ON_GROUND_FT = 0.05

/**
 * Whether the finished surface lies in the bank, above it, or crosses it, from ramp top to the end of the apron. Both
 * lines are straight between their points, so the points decide. A surface on the ground counts as cut, since the rock
 * has to be dug in.
 */
export function bankCase(given: {
  groundLine: readonly GroundPoint[]
  surface: readonly SurfacePoint[]
}): 'cut' | 'fill' | 'mixed' {
  const rocked = given.surface.filter(({ part }) => part !== 'approach')
  const from = rocked[0]?.stationFt ?? 0
  const to = rocked.at(-1)?.stationFt ?? 0
  const between = given.groundLine.filter(({ stationFt }) => stationFt > from && stationFt < to)
  const gapsFt = [...rocked, ...between].map(
    ({ stationFt }) => interpolateGround(given.groundLine, stationFt) - interpolateGround(rocked, stationFt),
  )
  const hasCut = gapsFt.some((gap) => gap > ON_GROUND_FT)
  const hasFill = gapsFt.some((gap) => gap < -ON_GROUND_FT)
  if (hasCut && hasFill) return 'mixed'
  return hasFill ? 'fill' : 'cut'
}
