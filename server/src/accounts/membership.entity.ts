import { Entity, Index } from 'typeorm'
import type { ApprovalLimits, Role } from 'shared'
import {
  DistrictIdColumn,
  FlagColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal } from '../platform/database/references.js'

/** What a person may do in a district, and up to which limits a design may be checked. */
@Entity('memberships')
@Index(['personId'])
@RefersToGlobal('districts', 'districtId')
@RefersToGlobal('people', 'personId')
export class Membership {
  @DistrictIdColumn() districtId: string

  @IdColumn() personId: string

  @TextColumn({ array: true }) roles: Role[]

  @JsonColumn({ nullable: true }) approvalLimits: ApprovalLimits | null

  @FlagColumn({ default: true }) isActive: boolean

  @InstantColumn() createdAt: Date
}
