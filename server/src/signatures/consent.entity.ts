import { Entity, Index } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** Agreement to electronic records, and its end. */
@Entity('consents')
@Index(['districtId', 'personId'])
@RefersTo('packets', 'packetId')
export class Consent {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() personId: string

  @ReferenceColumn() packetId: string

  @TextColumn() consentVersion: string

  @InstantColumn() agreedAt: Date

  @InstantColumn({ nullable: true }) withdrawnAt: Date | null
}
