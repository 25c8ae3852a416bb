import { Entity } from 'typeorm'
import { DistrictIdColumn, IdColumn, InstantColumn, PositionColumn } from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** Which page a person opened, and when. */
@Entity('page_readings')
@RefersTo('packets', 'packetId')
export class PageReading {
  @DistrictIdColumn() districtId: string

  @IdColumn() packetId: string

  @IdColumn() personId: string

  @PositionColumn() page: number

  @InstantColumn() readAt: Date
}
