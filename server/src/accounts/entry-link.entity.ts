import { Entity, Index, Unique } from 'typeorm'
import { IdColumn, InstantColumn, ReferenceColumn, TextColumn } from '../platform/database/columns.js'
import { RefersTo, RefersToKey } from '../platform/database/references.js'

/** A landowner's mailed way in to one job. Only the hash of its secret is kept. */
@Entity('entry_links')
@Unique(['tokenHash'])
@Index(['districtId', 'jobId'])
@RefersToKey('memberships', 'personId')
@RefersTo('jobs', 'jobId')
export class EntryLink {
  @IdColumn() id: string

  @ReferenceColumn() districtId: string

  @ReferenceColumn() personId: string

  @ReferenceColumn() jobId: string

  @TextColumn() tokenHash: string

  @InstantColumn() createdAt: Date

  @InstantColumn() expiresAt: Date

  @InstantColumn({ nullable: true }) revokedAt: Date | null
}
