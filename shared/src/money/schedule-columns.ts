import { csvColumns } from '../csv/csv-columns.js'
import type { ScheduleLine } from '../schemas/schedule.js'

/** Column of the file for every field of a line. */
export const scheduleColumnOf = {
  code: 'code',
  practice: 'practice',
  title: 'title',
  unit: 'unit',
  baseRate: 'base_rate',
  higherRate: 'higher_rate',
  quantityKey: 'quantity_key',
} as const satisfies Record<keyof ScheduleLine, string>

export type ScheduleColumn = (typeof scheduleColumnOf)[keyof ScheduleLine]

const spellings: { readonly [letters: string]: ScheduleColumn } = {
  code: 'code',
  practice: 'practice',
  practicecode: 'practice',
  title: 'title',
  description: 'title',
  unit: 'unit',
  units: 'unit',
  baserate: 'base_rate',
  rate: 'base_rate',
  higherrate: 'higher_rate',
  quantitykey: 'quantity_key',
}

/** Position of every column by its meaning. */
export const scheduleColumns = (header: readonly string[]): Map<ScheduleColumn, number> =>
  csvColumns({
    header,
    content: 'a payment schedule',
    wanted: Object.values(scheduleColumnOf),
    needed: ['code', 'practice', 'title', 'unit', 'base_rate'],
    spellings,
  })
