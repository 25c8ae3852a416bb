import type { FenceEnergizer } from './fence-energizer.js'
import type { FenceAreas } from './fence-areas.js'
import type { FenceNodeResult } from './fence-nodes.js'
import type { FenceWire } from './fence-wire.js'

export interface FenceRunResult {
  name: string
  lengthFt: number
  /** Length less the gate openings. */
  fencedLengthFt: number
  /** Stretches between braced posts, gates and the ends of the run, in order. */
  pullsFt: number[]
  corners: number
  /** Turn at each corner, degrees. */
  deflectionsDeg: number[]
  gates: number
  linePosts: number
  /** A pull that goes on straight into the next run has its in-line braces counted in the first of them. */
  inLineBraces: number
  wireFt: number
  hotWireFt: number
  lineInsulators: number
}

export interface FencePosts {
  line: number
  corner: number
  tee: number
  end: number
  gate: number
  /** Posts at which two runs meet in a straight line. */
  through: number
}

export interface FenceBraces {
  corner: number
  tee: number
  end: number
  gate: number
  inLine: number
  total: number
}

export interface FenceTakeOffResult extends FenceAreas {
  runs: FenceRunResult[]
  nodes: FenceNodeResult[]
  lengthFt: number
  fencedLengthFt: number
  posts: FencePosts
  braces: FenceBraces
  gates: { count: number; totalWidthFt: number }
  wire: FenceWire[]
  insulators: { line: number; strain: number }
  /** Absent when no run is energized. */
  energizer?: FenceEnergizer
  notes: string[]
}
