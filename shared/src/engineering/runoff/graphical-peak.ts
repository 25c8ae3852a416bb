import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { limitsCrossed } from './limits-crossed.js'
import { methodLimits } from './method-limits.js'
import { pondFactor } from './pond-factor.js'
import { potentialRetentionIn } from './potential-retention-in.js'
import { runoffDepthIn } from './runoff-depth-in.js'
import { CURVE_NUMBER_RANGE, RAINFALL_RANGE_IN } from './runoff-limits.js'
import { unitPeakCsmPerIn } from './unit-peak-csm-per-in.js'
import { unitPeakRows } from './unit-peak-rows.js'
import type { RainfallDistribution, UnitPeakRow } from './unit-peak-table.js'

export interface GraphicalPeakInput {
  method?: 'graphical'
  /** Drainage area, acres, greater than 0. */
  areaAcres: number
  /** Curve number, above 40 and at most 100. */
  curveNumber: number
  /** 24-hour rainfall P, in, 0 to 100. */
  rainfallIn: number
  /** Time of concentration, h, greater than 0 and at most 10; below 0.1 it is raised to 0.1. */
  timeOfConcentrationHr: number
  /** Rainfall distribution of the table, or a district's own rows. */
  distribution: RainfallDistribution | { rows: readonly UnitPeakRow[] }
  /** Ponds and swamps spread over the area, percent, 0 to 100; 0 unless given. */
  pondPercent?: number
}

export interface GraphicalPeakResult {
  runoffDepthIn: number
  initialAbstractionIn: number
  /** Ia/P of the site; 1, all rain lost, when there is no rain. */
  iaOverP: number
  iaOverPUsed: number
  timeUsedHr: number
  unitPeakCsmPerIn: number
  pondFactor: number
  peakCfs: number
  notes: string[]
}

const LEAST_TIME_HR = 0.1
const ACRES_PER_MI2 = 640

/**
 * Peak discharge by the graphical method, with its working: qp = qu · Am · Q · Fp, Ia = 0.2S,
 * Ia/P outside the rows uses the end row, Tc below 0.1 h is raised to 0.1 h; `notes` say so.
 *
 * @returns peakCfs in cfs, depths in inches, qu in csm/in, and what was used.
 * @throws EngineeringInputError naming the field, also for a site outside the method's limits of use.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, ch. 4 and appendix F.
 * @example graphicalPeak({ areaAcres: 250, curveNumber: 75, rainfallIn: 6, timeOfConcentrationHr: 1.53, distribution: 'II' }).peakCfs // 344.7
 */
export function graphicalPeak(input: GraphicalPeakInput): GraphicalPeakResult {
  const { areaAcres, CN, P, Tc } = checked(input)
  const rows = unitPeakRows(input.distribution)
  const Fp = pondFactor(input.pondPercent ?? 0)
  const Q = runoffDepthIn({ rainfallIn: P, curveNumber: CN })
  const Ia = 0.2 * potentialRetentionIn(CN)
  const iaOverP = P > 0 ? Ia / P : 1
  const iaOverPUsed = Math.min(Math.max(iaOverP, rows.first.iaOverP), rows.last.iaOverP)
  const timeUsedHr = Math.max(Tc, LEAST_TIME_HR)
  const qu = unitPeakCsmPerIn({ rows: rows.all, iaOverP: iaOverPUsed, timeHr: timeUsedHr })
  const Am = areaAcres / ACRES_PER_MI2
  return {
    runoffDepthIn: Q,
    initialAbstractionIn: Ia,
    iaOverP,
    iaOverPUsed,
    timeUsedHr,
    unitPeakCsmPerIn: qu,
    pondFactor: Fp,
    peakCfs: qu * Am * Q * Fp,
    notes: [
      ...(timeUsedHr === Tc
        ? []
        : [`Time of concentration is below ${LEAST_TIME_HR} h; ${LEAST_TIME_HR} h is used.`]),
      ...(iaOverPUsed === iaOverP ? [] : [`Ia/P is outside the table; its end row ${iaOverPUsed} is used.`]),
    ],
  }
}

function checked(input: GraphicalPeakInput) {
  const areaAcres = requireNumber({ field: 'areaAcres', value: input.areaAcres, exclusiveMin: 0, max: 1e6 })
  const CN = requireNumber({ field: 'curveNumber', value: input.curveNumber, ...CURVE_NUMBER_RANGE })
  const P = requireNumber({ field: 'rainfallIn', value: input.rainfallIn, ...RAINFALL_RANGE_IN })
  const Tc = requireNumber({
    field: 'timeOfConcentrationHr',
    value: input.timeOfConcentrationHr,
    exclusiveMin: 0,
  })
  const [crossed] = limitsCrossed({
    method: 'graphical',
    values: { curveNumber: CN, timeOfConcentrationHr: Tc },
    limits: methodLimits,
  })
  if (crossed) throw new EngineeringInputError({ field: crossed.field, message: crossed.sentence })
  return { areaAcres, CN, P, Tc }
}
