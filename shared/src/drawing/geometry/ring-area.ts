import type { Point } from '../shapes.js'

/** Area of a simple polygon, by the shoelace rule, never negative. */
export function ringArea(ring: readonly Point[]): number {
  const twice = ring.reduce((sum, point, index) => {
    const next = ring[(index + 1) % ring.length] ?? point
    return sum + point.x * next.y - next.x * point.y
  }, 0)
  return Math.abs(twice) / 2
}
