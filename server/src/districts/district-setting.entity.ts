import { Entity } from 'typeorm'
import {
  CivilDateColumn,
  DistrictIdColumn,
  IdTextColumn,
  InstantColumn,
  NumberColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal } from '../platform/database/references.js'

/** One engineering figure that no publication gives, as the district entered it. */
@Entity('district_settings')
@RefersToGlobal('districts', 'districtId')
export class DistrictSetting {
  @DistrictIdColumn() districtId: string

  @IdTextColumn() key: string

  @NumberColumn({ nullable: true }) value: number | null

  @TextColumn() source: string

  @CivilDateColumn() sourceDate: string

  @InstantColumn() updatedAt: Date
}
