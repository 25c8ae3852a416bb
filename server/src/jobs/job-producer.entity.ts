import { Entity, Index } from 'typeorm'
import { CountColumn, DistrictIdColumn, FlagColumn, IdColumn } from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** Whose job it is. */
@Entity('job_producers')
@Index(['districtId', 'producerId'])
@RefersTo('jobs', 'jobId')
@RefersTo('producers', 'producerId')
export class JobProducer {
  @DistrictIdColumn() districtId: string

  @IdColumn() jobId: string

  @IdColumn() producerId: string

  @CountColumn() position: number

  @FlagColumn({ default: true }) isSigner: boolean
}
