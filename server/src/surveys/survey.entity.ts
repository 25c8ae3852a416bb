import { Entity } from 'typeorm'
import type { SurveyInput, SurveyReduction, SurveyView } from 'shared'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** The level notes or ground line of a job, with what they reduce to. */
@Entity('surveys')
@RefersTo('jobs', 'jobId')
export class Survey {
  @DistrictIdColumn() districtId: string

  @IdColumn() jobId: string

  @JsonColumn() survey: SurveyInput

  @JsonColumn() groundLine: SurveyView['groundLine']

  @JsonColumn({ nullable: true }) reduction: SurveyReduction | null

  @VersionColumn() version: number

  @ReferenceColumn() updatedBy: string

  @InstantColumn() updatedAt: Date
}
