import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { logLogBetween } from './log-log-between.js'
import type { RainfallTable, ReadRainfallTableInput } from './rainfall-table.js'
import { readRainfallTable } from './read-rainfall-table.js'

export interface RainfallFromTableInput extends ReadRainfallTableInput {
  /** One of the table's return periods, years. */
  returnPeriodYr: number
  /** Duration, h, between the shortest and the longest of the table. */
  durationHr: number
}

/**
 * Rainfall depth from a point-precipitation table: the row of that duration, or between two rows straight on
 * log-log paper; never beyond the table, never between return periods.
 *
 * @returns depth in inches.
 * @throws EngineeringInputError naming text, returnPeriodYr or durationHr.
 * Source: layout of NOAA Atlas 14 point precipitation files; interpolation common practice.
 * @example rainfallFromTable({ text, returnPeriodYr: 10, durationHr: 24 }) // 7.28
 */
export function rainfallFromTable(input: RainfallFromTableInput): number {
  const returnPeriodYr = requireNumber({
    field: 'returnPeriodYr',
    value: input.returnPeriodYr,
    exclusiveMin: 0,
  })
  const durationHr = requireNumber({ field: 'durationHr', value: input.durationHr, exclusiveMin: 0 })
  const table = readRainfallTable(input)
  const column = table.returnPeriodsYr.indexOf(returnPeriodYr)
  if (column < 0) {
    throw new EngineeringInputError({
      field: 'returnPeriodYr',
      message: `returnPeriodYr is ${returnPeriodYr}; the table has ${table.returnPeriodsYr.join(', ')} years.`,
    })
  }
  return depthAt(table, column, durationHr)
}

function depthAt(table: RainfallTable, column: number, durationHr: number): number {
  // By label, within 0.01 min: a typed 0.0833 h means the 5-min row, which 5/60 as a float would miss.
  const points = table.durationsHr.map((x, row) => ({ x, y: table.depthsIn[row]?.[column] ?? 0 }))
  const labelled = points.find(({ x }) => Math.abs(x - durationHr) * 60 < 0.01)
  const depth = labelled?.y ?? logLogBetween(points, durationHr)
  if (depth !== undefined) return depth
  const [first, last] = [table.durationLabels[0], table.durationLabels[table.durationLabels.length - 1]]
  throw new EngineeringInputError({
    field: 'durationHr',
    message: `durationHr is ${durationHr}; the table reaches from ${first} to ${last}.`,
  })
}
