import type { GraphicalPeakResult } from './graphical-peak.js'
import type { MethodLimit } from './method-limits.js'
import type { TimeOfConcentrationInput, TimeOfConcentrationResult } from './time-of-concentration.js'
import type { RainfallDistribution, UnitPeakRow } from './unit-peak-table.js'

export type PeakMethod = 'graphical' | 'rational'

export interface RainfallIntensity {
  /** Duration of the rain, min, greater than 0. */
  durationMin: number
  /** Mean intensity over that duration at the design return period, in/h, greater than 0. */
  intensityInPerHr: number
}

export interface GivenTimeInput {
  method: 'given'
  /** Time of concentration found elsewhere, h, greater than 0. */
  timeOfConcentrationHr: number
}

export interface DesignPeakInput {
  /** Methods asked for, at least one. */
  methods: readonly PeakMethod[]
  areaAcres: number
  curveNumber: number
  rainfallIn: number
  timeOfConcentration: TimeOfConcentrationInput | GivenTimeInput
  distribution: RainfallDistribution | { rows: readonly UnitPeakRow[] }
  pondPercent?: number
  /** Needed for the rational method only. */
  rational?: {
    runoffCoefficient: number
    /** Duration and intensity pairs of one return period, durations ascending. */
    intensities: readonly RainfallIntensity[]
  }
  /** Limits of use held beside the published ones: a district setting. */
  districtLimits?: readonly MethodLimit[]
}

export interface Refused {
  refused: string
}

export interface RationalPeakResult {
  timeUsedHr: number
  intensityInPerHr: number
  peakCfs: number
  notes: string[]
}

export interface DesignPeakResult {
  timeOfConcentration: TimeOfConcentrationResult
  graphical?: GraphicalPeakResult | Refused
  rational?: RationalPeakResult | Refused
  designPeakCfs: number
  governs: PeakMethod
  /** One sentence: which method governs and why. */
  reason: string
  notes: string[]
}
