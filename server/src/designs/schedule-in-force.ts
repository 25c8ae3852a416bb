import type { ScheduleInput } from 'shared'
import type { PaymentSchedule } from '../schedules/payment-schedule.entity.js'
import type { ScheduleLineRow } from '../schedules/schedule-line.entity.js'

/** A schedule as the funding of a design reads it. */
export interface ScheduleInForce extends ScheduleInput {
  id: string
}

/** An empty column means: the schedule does not say, which is not the same as nothing. */
export function scheduleInForce(row: PaymentSchedule, lines: readonly ScheduleLineRow[]): ScheduleInForce {
  const { id, key, name, fiscalYear, kind, effectiveFrom, effectiveTo } = row
  const { percent, higherPercent, percentOf, cap, amount, advancePercent, practices } = row
  return {
    ...{ id, key, name, fiscalYear, kind, effectiveFrom, effectiveTo },
    ...said({ percent, higherPercent, percentOf, cap, amount, advancePercent, practices }),
    lines: lines.map(({ code, practice, title, unit, baseRate, higherRate, quantityKey }) => ({
      ...{ code, practice, title, unit, baseRate, quantityKey },
      ...said({ higherRate }),
    })),
  }
}

type Said<Columns> = { [Key in keyof Columns]?: NonNullable<Columns[Key]> }

const said = <Columns extends object>(columns: Columns): Said<Columns> =>
  Object.fromEntries(Object.entries(columns).filter(([, value]) => value !== null)) as Said<Columns>
