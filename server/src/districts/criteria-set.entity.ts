import { Entity, Index } from 'typeorm'
import type { Criterion, VersionedStatus } from 'shared'
import {
  CivilDateColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  TextColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal } from '../platform/database/references.js'

/** The criteria a design is judged by. Never edited once in force. */
@Entity('criteria_sets')
@Index('uq_criteria_sets_in_force', ['districtId'], { unique: true, where: "status = 'in-force'" })
@RefersToGlobal('districts', 'districtId')
export class CriteriaSet {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @TextColumn() name: string

  @CivilDateColumn() effectiveFrom: string

  @JsonColumn() criteria: Criterion[]

  @TextColumn() status: VersionedStatus

  @VersionColumn() version: number

  @InstantColumn() createdAt: Date

  @InstantColumn({ nullable: true }) inForceAt: Date | null

  @InstantColumn({ nullable: true }) retiredAt: Date | null
}
