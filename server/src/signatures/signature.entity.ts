import { Entity, Index } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

export type SignatureMethod = 'mailed-link-and-code' | 'password' | 'at-the-table' | 'on-paper'

/** A signature is never deleted; a void one stays in plain sight. */
@Entity('signatures')
@Index('uq_signatures_standing', ['districtId', 'packetId', 'personId'], {
  unique: true,
  where: 'void_at is null',
})
@Index(['districtId', 'jobId'])
@RefersTo('jobs', 'jobId')
@RefersTo('packets', 'packetId')
@RefersTo('consents', 'consentId')
export class Signature {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn() packetId: string

  @ReferenceColumn() personId: string

  @TextColumn() typedName: string

  @TextColumn() packetSha256: string

  @ReferenceColumn() consentId: string

  @ReferenceColumn() sessionId: string

  /** How the signer came in. */
  @TextColumn() method: SignatureMethod

  /** As the server saw it, through trusted proxies only. */
  @TextColumn() remoteAddress: string

  @TextColumn() userAgent: string

  @InstantColumn() signedAt: Date

  @InstantColumn({ nullable: true }) voidAt: Date | null

  @TextColumn({ nullable: true }) voidReason: string | null
}
