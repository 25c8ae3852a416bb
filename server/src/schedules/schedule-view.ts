import type { ScheduleLine, ScheduleView } from 'shared'
import type { PaymentSchedule } from './payment-schedule.entity.js'
import type { ScheduleLineRow } from './schedule-line.entity.js'

/** An empty column is left out: the schedule does not say, which is not the same as nothing. */
export function scheduleView(row: PaymentSchedule, lines: readonly ScheduleLineRow[]): ScheduleView {
  const { id, key, name, fiscalYear, kind, effectiveFrom, effectiveTo, status, version } = row
  const { percent, higherPercent, percentOf, cap, amount, advancePercent, practices } = row
  return {
    ...{ id, key, name, fiscalYear, kind, effectiveFrom, effectiveTo, status, version },
    ...said({ percent, higherPercent, percentOf, cap, amount, advancePercent, practices }),
    lines: lines.map(lineView),
  }
}

const lineView = ({
  code,
  practice,
  title,
  unit,
  baseRate,
  higherRate,
  quantityKey,
}: ScheduleLineRow): ScheduleLine => ({
  ...{ code, practice, title, unit, baseRate: rateText(baseRate), quantityKey },
  ...said({ higherRate: higherRate === null ? null : rateText(higherRate) }),
})

/** The database keeps four places of every rate; a person wrote as many as the schedule prints, and two at least. */
const rateText = (rate: string): string => rate.replace(/(\.\d{2}\d*?)0+$/, '$1')

type Said<Columns> = { [Key in keyof Columns]?: NonNullable<Columns[Key]> }

const said = <Columns extends object>(columns: Columns): Said<Columns> =>
  Object.fromEntries(Object.entries(columns).filter(([, value]) => value !== null)) as Said<Columns>
