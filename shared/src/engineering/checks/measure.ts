import type { CheckFacts } from './check-facts.js'

export interface Measured {
  /** Null: the figure is not known, and `note` says why. */
  actual: number | boolean | null
  /** A limit that follows from the design itself; a limit of the criterion holds over it. */
  limit?: number | readonly [number, number]
  note?: string
  /** An unknown figure that a reviewer must look at is a caution; any other is not applicable. */
  cautionWhenUnknown?: true
}

/** Reads one figure off a design. Undefined: the part it needs is not ready. */
export type Measure = (facts: CheckFacts) => Measured | undefined

export interface MeasureTable {
  readonly [checkId: string]: Measure
}

/** A figure that is not known or does not apply, and why. */
export const unknown = (note: string): Measured => ({ actual: null, note })
