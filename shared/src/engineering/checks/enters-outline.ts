interface Place {
  eastFt: number
  northFt: number
}

/** Whether a polyline has a point inside a closed outline or crosses it. A run that ends at the outline stays out. */
export function entersOutline({
  points,
  outline,
}: {
  points: readonly Place[]
  outline: readonly Place[]
}): boolean {
  const edges = outline.map((from, index) => ({ from, to: outline[(index + 1) % outline.length] ?? from }))
  if (points.some((point) => !isOnEdge(point, edges) && isInside(point, edges))) return true
  return points.slice(1).some((to, index) => {
    const from = points[index]
    return from !== undefined && edges.some((edge) => cross({ from, to }, edge))
  })
}

interface Leg {
  from: Place
  to: Place
}

const ON_EDGE_FT = 1e-6

function isOnEdge(point: Place, edges: readonly Leg[]): boolean {
  const apartFt = (a: Place, b: Place) => Math.hypot(a.eastFt - b.eastFt, a.northFt - b.northFt)
  return edges.some(({ from, to }) => {
    return apartFt(from, point) + apartFt(point, to) - apartFt(from, to) < ON_EDGE_FT
  })
}

/** Counts the edges that a ray to the east meets: an odd number means inside. */
function isInside({ eastFt, northFt }: Place, edges: readonly Leg[]): boolean {
  const met = edges.filter(({ from, to }) => {
    if (from.northFt > northFt === to.northFt > northFt) return false
    const share = (northFt - from.northFt) / (to.northFt - from.northFt)
    return eastFt < from.eastFt + share * (to.eastFt - from.eastFt)
  })
  return met.length % 2 === 1
}

/** Positive where `point` lies left of the leg. */
const side = ({ from, to }: Leg, point: Place): number =>
  (to.eastFt - from.eastFt) * (point.northFt - from.northFt) -
  (to.northFt - from.northFt) * (point.eastFt - from.eastFt)

const cross = (a: Leg, b: Leg): boolean =>
  side(a, b.from) * side(a, b.to) < 0 && side(b, a.from) * side(b, a.to) < 0
