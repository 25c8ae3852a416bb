import { Entity, Index } from 'typeorm'
import { IdColumn, InstantColumn, ReferenceColumn, TextColumn } from '../platform/database/columns.js'
import { RefersToKey } from '../platform/database/references.js'

/** One sign-in of one person in one district. It is read on every request, so that ending it works at once. */
@Entity('sessions')
@Index(['districtId', 'personId'])
@RefersToKey('memberships', 'personId')
export class Session {
  @IdColumn() id: string

  @ReferenceColumn() districtId: string

  @ReferenceColumn() personId: string

  /** Set when a landowner came by a mailed link: the one job it opens. */
  @ReferenceColumn({ nullable: true }) jobId: string | null

  @InstantColumn() startedAt: Date

  @InstantColumn() lastSeenAt: Date

  @InstantColumn() expiresAt: Date

  @InstantColumn({ nullable: true }) revokedAt: Date | null

  @TextColumn() userAgent: string
}
