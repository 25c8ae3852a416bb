export interface CurvePoint {
  x: number
  y: number
}

/**
 * Value of a curve that is straight between its points on log-log paper; never beyond its ends.
 *
 * @param points at least one, x strictly ascending, x and y greater than 0.
 * @returns y at x, or undefined when x lies outside the points.
 * Common practice for rainfall by duration.
 * @example logLogBetween([{ x: 5, y: 7.2 }, { x: 10, y: 5.76 }], 7.322) // 6.368
 */
export function logLogBetween(points: readonly CurvePoint[], x: number): number | undefined {
  const exact = points.find((point) => point.x === x)
  if (exact) return exact.y
  const upperIndex = points.findIndex((point) => point.x > x)
  const upper = points[upperIndex]
  const lower = points[upperIndex - 1]
  if (!upper || !lower) return undefined
  const share = Math.log(x / lower.x) / Math.log(upper.x / lower.x)
  return lower.y * (upper.y / lower.y) ** share
}
