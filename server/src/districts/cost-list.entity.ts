import { Entity, Index } from 'typeorm'
import type { CostLine, VersionedStatus } from 'shared'
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

/** Unit costs of one date. Never edited once in force. */
@Entity('cost_lists')
@Index('uq_cost_lists_in_force', ['districtId'], { unique: true, where: "status = 'in-force'" })
@RefersToGlobal('districts', 'districtId')
export class CostList {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @TextColumn() name: string

  @CivilDateColumn() effectiveFrom: string

  @TextColumn() source: string

  @JsonColumn() lines: CostLine[]

  @TextColumn() status: VersionedStatus

  @VersionColumn() version: number

  @InstantColumn() createdAt: Date

  @InstantColumn({ nullable: true }) inForceAt: Date | null

  @InstantColumn({ nullable: true }) retiredAt: Date | null
}
