import { Entity, Index } from 'typeorm'
import {
  CountColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal } from '../platform/database/references.js'

/** A code of six digits, mailed when a link is opened. */
@Entity('entry_codes')
@Index(['linkId', 'createdAt'])
@RefersToGlobal('entry_links', 'linkId')
export class EntryCode {
  @IdColumn() id: string

  @ReferenceColumn() districtId: string

  @ReferenceColumn() linkId: string

  @TextColumn() codeHash: string

  @InstantColumn() createdAt: Date

  @InstantColumn() expiresAt: Date

  @CountColumn({ default: 0 }) tries: number

  @InstantColumn({ nullable: true }) usedAt: Date | null
}
