import type { Point } from '../shapes.js'

/** Even-odd rule. */
export function isInPolygon(point: Point, ring: readonly Point[]): boolean {
  return ring.reduce((inside, end, index) => {
    const start = ring[(index + ring.length - 1) % ring.length] ?? end
    const straddles = start.y > point.y !== end.y > point.y
    if (!straddles) return inside
    const crossX = start.x + ((point.y - start.y) / (end.y - start.y)) * (end.x - start.x)
    return point.x < crossX ? !inside : inside
  }, false)
}
