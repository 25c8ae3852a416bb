import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { unitPeakTable, type RainfallDistribution, type UnitPeakRow } from './unit-peak-table.js'

interface UnitPeakRows {
  all: readonly UnitPeakRow[]
  first: UnitPeakRow
  last: UnitPeakRow
}

/**
 * Rows of a rainfall distribution: the published table's, or a district's own, checked.
 *
 * @throws EngineeringInputError naming distribution, or the field of a district's row.
 * @example unitPeakRows('II').first.iaOverP // 0.1
 */
export function unitPeakRows(
  distribution: RainfallDistribution | { rows: readonly UnitPeakRow[] },
): UnitPeakRows {
  const all = typeof distribution === 'string' ? unitPeakTable[distribution] : checkedRows(distribution.rows)
  const first = all?.[0]
  const last = all?.[all.length - 1]
  if (!first || !last) {
    throw new EngineeringInputError({
      field: 'distribution',
      message: 'distribution is not known; give I, IA, II, III or at least one row of the district.',
    })
  }
  return { all, first, last }
}

function checkedRows(rows: readonly UnitPeakRow[]): readonly UnitPeakRow[] {
  rows.forEach((row, index) => {
    const at = `distribution.rows[${index}]`
    const previous = rows[index - 1]?.iaOverP
    const floor = previous === undefined ? { min: 0 } : { exclusiveMin: previous }
    requireNumber({ field: `${at}.iaOverP`, value: row.iaOverP, ...floor, max: 1 })
    for (const key of ['c0', 'c1', 'c2'] as const) {
      requireNumber({ field: `${at}.${key}`, value: row[key], min: -10, max: 10 })
    }
  })
  return rows
}
