import type { PlanPoint } from '../survey/signed-area.js'

export type FenceRole = 'exclusion' | 'lane' | 'closing' | 'other'
export type FenceKind = 'electric' | 'barbed' | 'woven' | 'smooth'

/** Ends with the same label, or within half a foot of each other, are one place. */
interface EndLabels {
  startsAt?: string
  endsAt?: string
}

export interface DrawnFencePath extends EndLabels {
  /** Points of the run in order, ft east and north; at least two that differ. */
  points: readonly PlanPoint[]
}

export interface MeasuredFencePath extends EndLabels {
  /** Length of a run that nobody has drawn, ft, greater than 0. */
  lengthFt: number
}

export type FencePath = DrawnFencePath | MeasuredFencePath

export interface FenceGate {
  /** Opening, ft, greater than 0 and less than the pull it stands in. */
  widthFt: number
  /** From the start of the run to the middle of the gate, ft; without it the middle of the first pull it fits in. */
  atFt?: number
}

export interface FenceRun {
  name: string
  role: FenceRole
  path: FencePath
  fence: FenceKind
  energized: boolean
  inWater: boolean
  /** Single wires, a whole number up to 30; on woven fence those beside the netting, and there it may be 0. */
  wires: number
  /** Wires that carry the pulse, at most `wires`; all of them on an energized run unless given. */
  hotWires?: number
  /** Greatest distance between line posts, ft, greater than 0. */
  postSpacingFt: number
  gates: readonly FenceGate[]
  /** Name of the single wire, such as 'high-tensile'; a key of `rollLengthFt`. */
  wireKind: string
}

export interface FenceNode {
  label: string
  /** Tied to a braced post that already stands. */
  existing: boolean
}

export interface EnergizerRule {
  basis: 'fence-mile' | 'hot-wire-mile'
  /** Joules of output per mile, greater than 0. */
  joulesPerMile: number
  /** Energizers that can be bought, joules, ascending; the next size up is taken. */
  sizesJoules?: readonly number[]
}

export interface GroundRodRule {
  /** Rod length per joule of output, ft, greater than 0. */
  rodFtPerJoule: number
  /** Length of one rod, ft, greater than 0. */
  rodLengthFt: number
  /** Least number of rods, a whole number, 0 or more. */
  minimumRods: number
}

export interface FenceTakeOffInput {
  runs: readonly FenceRun[]
  nodes?: readonly FenceNode[]
  /** A turn of more than this is a corner, degrees, 0 to 180. */
  cornerAngleDeg: number
  /** Longest pull without an in-line brace, ft, greater than 0. */
  maxPullFt: number
  /** Length of a roll by kind of wire, ft; netting of woven fence under 'netting'. */
  rollLengthFt: Readonly<Record<string, number>>
  /** Wire to tie off at each end of a pull, ft for each wire; 0 unless given. */
  tieOffFt?: number
  /** Added to wire for waste, percent, 0 to 100. */
  wastePercent: number
  energizerRule: EnergizerRule
  groundRodRule: GroundRodRule
  /** Fence (or hot wire, as the rule counts) already on the same energizer, miles; 0 unless given. */
  existingEnergizedMiles?: number
  /** Edge of the water at full pool, ft east and north, open or closed ring. */
  waterOutline?: readonly PlanPoint[]
  /** Ramp and lane inside the exclusion fence, ft²; 0 unless given. */
  laneAreaFt2?: number
}

/** Key of `rollLengthFt` for the netting of woven fence. */
export const NETTING_KIND = 'netting'
