import type { ScheduleInput } from 'shared'
import type { PaymentSchedule } from './payment-schedule.entity.js'
import type { ScheduleLineRow } from './schedule-line.entity.js'

type Terms = Omit<
  PaymentSchedule,
  'districtId' | 'id' | 'status' | 'version' | 'createdAt' | 'inForceAt' | 'retiredAt'
>

/** The whole schedule is given each time, so what is left out is taken away. */
export function termColumns(input: ScheduleInput): Terms {
  const { key, name, fiscalYear, kind, effectiveFrom, effectiveTo } = input
  return {
    ...{ key, name, fiscalYear, kind, effectiveFrom, effectiveTo },
    percent: input.percent ?? null,
    higherPercent: input.higherPercent ?? null,
    percentOf: input.percentOf ?? null,
    cap: input.cap ?? null,
    amount: input.amount ?? null,
    advancePercent: input.advancePercent ?? null,
    practices: input.practices ?? null,
  }
}

export const lineRows = (
  { districtId, id: scheduleId }: Pick<PaymentSchedule, 'districtId' | 'id'>,
  { lines }: ScheduleInput,
): ScheduleLineRow[] =>
  lines.map((line, position) => ({
    ...line,
    ...{ districtId, scheduleId, position },
    higherRate: line.higherRate ?? null,
  }))
