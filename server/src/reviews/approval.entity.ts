import { Entity, Index, Unique } from 'typeorm'
import {
  CivilDateColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** The board's yes to packet and public money. */
@Entity('approvals')
@Unique(['districtId', 'packetId'])
@Index(['districtId', 'jobId'])
@RefersTo('jobs', 'jobId')
@RefersTo('packets', 'packetId')
export class Approval {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn() packetId: string

  @ReferenceColumn() supervisorId: string

  @TextColumn() packetSha256: string

  @CivilDateColumn({ nullable: true }) meetingDate: string | null

  @TextColumn({ nullable: true }) agendaItem: string | null

  @InstantColumn() approvedAt: Date
}
