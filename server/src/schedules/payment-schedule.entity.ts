import { Entity, Index } from 'typeorm'
import type { Money, ScheduleInput, VersionedStatus } from 'shared'
import {
  CivilDateColumn,
  CountColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  MoneyColumn,
  NumberColumn,
  TextColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal } from '../platform/database/references.js'

/** What one funding source pays in one fiscal year. Never edited once in force. */
@Entity('payment_schedules')
@Index('uq_payment_schedules_in_force', ['districtId', 'key'], { unique: true, where: "status = 'in-force'" })
@RefersToGlobal('districts', 'districtId')
export class PaymentSchedule {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @TextColumn() key: string

  @TextColumn() name: string

  @CountColumn() fiscalYear: number

  @TextColumn() kind: ScheduleInput['kind']

  @CivilDateColumn() effectiveFrom: string

  @CivilDateColumn() effectiveTo: string

  @NumberColumn({ nullable: true }) percent: number | null

  @NumberColumn({ nullable: true }) higherPercent: number | null

  @TextColumn({ nullable: true }) percentOf: NonNullable<ScheduleInput['percentOf']> | null

  @MoneyColumn({ nullable: true }) cap: Money | null

  @MoneyColumn({ nullable: true }) amount: Money | null

  @NumberColumn({ nullable: true }) advancePercent: number | null

  @TextColumn({ array: true, nullable: true }) practices: string[] | null

  @TextColumn() status: VersionedStatus

  @VersionColumn() version: number

  @InstantColumn() createdAt: Date

  @InstantColumn({ nullable: true }) inForceAt: Date | null

  @InstantColumn({ nullable: true }) retiredAt: Date | null
}
