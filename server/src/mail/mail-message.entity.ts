import { Entity, Index, Unique } from 'typeorm'
import type { MailView } from 'shared'
import {
  CountColumn,
  DistrictIdColumn,
  FlagColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** One message with one Message-ID, however often it is tried. */
@Entity('mail_messages')
@Unique(['messageId'])
@Index(['districtId', 'jobId', 'queuedAt'])
@RefersTo('jobs', 'jobId')
@RefersTo('files', 'attachmentFileId')
export class MailMessage {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn({ nullable: true }) jobId: string | null

  @TextColumn() kind: string

  @ReferenceColumn({ nullable: true }) toPersonId: string | null

  @TextColumn() toAddress: string

  @TextColumn() subject: string

  @TextColumn({ nullable: true }) text: string | null

  /** The text carries a link or code: it is wiped once the message is sent. */
  @FlagColumn({ default: false }) isSecret: boolean

  @TextColumn() messageId: string

  @TextColumn() status: MailView['status']

  @CountColumn({ default: 0 }) attempts: number

  @InstantColumn() queuedAt: Date

  @InstantColumn({ nullable: true }) sentAt: Date | null

  @TextColumn({ nullable: true }) lastError: string | null

  @ReferenceColumn({ nullable: true }) attachmentFileId: string | null

  @TextColumn({ nullable: true }) attachmentName: string | null

  @ReferenceColumn({ nullable: true }) queuedBy: string | null
}
