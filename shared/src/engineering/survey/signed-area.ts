export interface PlanPoint {
  eastFt: number
  northFt: number
}

/** Shoelace: A = ½ Σ (x_i · y_{i+1} − x_{i+1} · y_i), ft², positive counter-clockwise. The ring closes itself. */
export function signedAreaFt2(ring: readonly PlanPoint[]): number {
  return (
    ring.reduce((sum, point, index) => {
      const next = ring[(index + 1) % ring.length] ?? point
      return sum + point.eastFt * next.northFt - next.eastFt * point.northFt
    }, 0) / 2
  )
}
