const MOST_HALVINGS = 200

export interface BracketedRootInput {
  /** Rises through 0 between low and high. */
  f: (x: number) => number
  low: number
  high: number
  tolerance: number
}

/**
 * Root of a rising function between two bounds by halving. Slower than Newton's step, but it cannot leave the
 * bracket, which matters where the roughness itself depends on the flow.
 *
 * @returns x within `tolerance` of the root.
 * @example bracketedRoot({ f: (x) => x * x - 2, low: 0, high: 2, tolerance: 1e-9 }) // 1.414213562
 */
export function bracketedRoot({ f, low, high, tolerance }: BracketedRootInput): number {
  let below = low
  let above = high
  for (let halving = 0; halving < MOST_HALVINGS && above - below > tolerance; halving += 1) {
    const middle = (below + above) / 2
    if (f(middle) < 0) below = middle
    else above = middle
  }
  return (below + above) / 2
}
