import { legsCross, legsOfRing } from './plan-leg.js'
import type { PlanPoint } from './signed-area.js'

export interface CrossingLegs {
  /** Legs counted from 1; leg n runs from point n to the next, the last one back to point 1. */
  first: number
  second: number
}

/** First pair of legs of a closed ring that cross each other, since a crossed ring has no area. */
export function findSelfCrossing(ring: readonly PlanPoint[]): CrossingLegs | undefined {
  const legs = legsOfRing(ring)
  for (const [i, first] of legs.entries()) {
    for (let j = i + 2; j < legs.length; j += 1) {
      const second = legs[j]
      const share = i === 0 && j === legs.length - 1
      if (second !== undefined && !share && legsCross(first, second)) return { first: i + 1, second: j + 1 }
    }
  }
  return undefined
}
