import type { ScheduleInput } from 'shared'

/** A schedule as the funding of a design reads it. */
export interface ScheduleInForce extends ScheduleInput {
  id: string
}
