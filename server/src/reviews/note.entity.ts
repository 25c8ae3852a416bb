import { Entity, Index } from 'typeorm'
import type { NoteView, Role } from 'shared'
import {
  CountColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  NumberColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** A remark on a page or on the job, answered and settled one by one. */
@Entity('notes')
@Index(['districtId', 'jobId', 'writtenAt'])
@RefersTo('jobs', 'jobId')
@RefersTo('packets', 'packetId')
export class Note {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn({ nullable: true }) packetId: string | null

  @CountColumn({ nullable: true }) revision: number | null

  @CountColumn({ nullable: true }) page: number | null

  @NumberColumn({ nullable: true }) xMm: number | null

  @NumberColumn({ nullable: true }) yMm: number | null

  @TextColumn() text: string

  @ReferenceColumn() authorId: string

  @TextColumn() authorRole: Role

  @TextColumn() status: NoteView['status']

  @InstantColumn() writtenAt: Date

  @ReferenceColumn({ nullable: true }) settledBy: string | null

  @InstantColumn({ nullable: true }) settledAt: Date | null
}
