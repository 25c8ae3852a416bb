import { Entity, Unique } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  PositionColumn,
  RateColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersToOwner } from '../platform/database/references.js'

/** One line of a payment schedule, in its printed order. */
@Entity('schedule_lines')
@Unique(['districtId', 'scheduleId', 'code'])
@RefersToOwner('payment_schedules', 'scheduleId')
export class ScheduleLineRow {
  @DistrictIdColumn() districtId: string

  @IdColumn() scheduleId: string

  @PositionColumn() position: number

  @TextColumn() code: string

  @TextColumn() practice: string

  @TextColumn() title: string

  @TextColumn() unit: string

  @RateColumn() baseRate: string

  @RateColumn({ nullable: true }) higherRate: string | null

  @TextColumn({ nullable: true }) quantityKey: string | null
}
