import { Entity, Unique } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** Who let a missed criterion stand, and why. */
@Entity('variances')
@Unique(['districtId', 'designId', 'criterionId'])
@RefersTo('jobs', 'jobId')
@RefersTo('designs', 'designId')
export class Variance {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn() designId: string

  @TextColumn() criterionId: string

  @TextColumn() reason: string

  @ReferenceColumn() decidedBy: string

  @InstantColumn() decidedAt: Date
}
