import { EngineeringInputError } from '../engineering-input-error.js'
import type { UnitPeakRow } from './unit-peak-table.js'

interface UnitPeakInput {
  /** At least one row, iaOverP strictly ascending. */
  rows: readonly UnitPeakRow[]
  /** Ia/P inside the reach of the rows. */
  iaOverP: number
  /** Time of concentration, h, greater than 0. */
  timeHr: number
}

const atRow = ({ c0, c1, c2 }: UnitPeakRow, logTime: number) => 10 ** (c0 + c1 * logTime + c2 * logTime ** 2)

/**
 * Unit peak discharge: log10 qu = C0 + C1 log10 Tc + C2 (log10 Tc)². Between two rows of Ia/P it is qu that is
 * interpolated, not the coefficients: the chart of the method is read between its curves in the same way.
 *
 * @returns qu in cfs per square mile per inch of runoff.
 * @throws EngineeringInputError naming distribution.rows when there is no row.
 * Source: USDA NRCS, TR-55, 2nd ed., June 1986, appendix F.
 * @example unitPeakCsmPerIn({ rows: unitPeakTable.II, iaOverP: 0.111, timeHr: 1.53 }) // 268.9
 */
export function unitPeakCsmPerIn({ rows, iaOverP, timeHr }: UnitPeakInput): number {
  const logTime = Math.log10(timeHr)
  const upper = rows.find((row) => row.iaOverP >= iaOverP) ?? rows[rows.length - 1]
  const lower = rows.findLast((row) => row.iaOverP <= iaOverP) ?? rows[0]
  if (!upper || !lower) {
    throw new EngineeringInputError({
      field: 'distribution.rows',
      message: 'distribution.rows is empty; give at least one row.',
    })
  }
  const lowerPeak = atRow(lower, logTime)
  if (upper.iaOverP === lower.iaOverP) return lowerPeak
  const share = (iaOverP - lower.iaOverP) / (upper.iaOverP - lower.iaOverP)
  return lowerPeak + share * (atRow(upper, logTime) - lowerPeak)
}
