import type { PlanPoint } from './signed-area.js'

export interface CrossingLegs {
  /** Legs counted from 1; leg n runs from point n to the next, the last one back to point 1. */
  first: number
  second: number
}

/** First pair of legs of a closed ring that cross each other, since a crossed ring has no area. */
export function findSelfCrossing(ring: readonly PlanPoint[]): CrossingLegs | undefined {
  const legs = ring.map((from, index) => ({ from, to: ring[(index + 1) % ring.length] ?? from }))
  for (const [i, first] of legs.entries()) {
    for (let j = i + 2; j < legs.length; j += 1) {
      const second = legs[j]
      const share = i === 0 && j === legs.length - 1
      if (second !== undefined && !share && cross(first, second)) return { first: i + 1, second: j + 1 }
    }
  }
  return undefined
}

interface Leg {
  from: PlanPoint
  to: PlanPoint
}

function cross(a: Leg, b: Leg): boolean {
  return side(a, b.from) * side(a, b.to) < 0 && side(b, a.from) * side(b, a.to) < 0
}

function side({ from, to }: Leg, point: PlanPoint): number {
  return Math.sign(
    (to.eastFt - from.eastFt) * (point.northFt - from.northFt) -
      (to.northFt - from.northFt) * (point.eastFt - from.eastFt),
  )
}
