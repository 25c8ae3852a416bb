import { Entity } from 'typeorm'
import type { ApprovalLimits } from 'shared'
import {
  DistrictIdColumn,
  FlagColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** The check of figures and criteria by somebody whose limits cover the design. */
@Entity('technical_checks')
@RefersTo('packets', 'packetId')
export class TechnicalCheck {
  @DistrictIdColumn() districtId: string

  @IdColumn() packetId: string

  @ReferenceColumn() checkerId: string

  @FlagColumn({ default: false }) withinLimits: boolean

  @JsonColumn({ nullable: true }) limits: ApprovalLimits | null

  @TextColumn({ nullable: true }) note: string | null

  @InstantColumn() checkedAt: Date
}
