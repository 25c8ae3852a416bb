import { Entity, Index } from 'typeorm'
import type { DesignPlan, DesignResult, ResolvedWith } from 'shared'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  TextColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersTo, RefersToGlobal } from '../platform/database/references.js'

/** One alternative of a job: what the planner chose and what follows from it. */
@Entity('designs')
@Index(['districtId', 'jobId'])
@RefersTo('jobs', 'jobId')
@RefersToGlobal('people', 'designerId')
export class Design {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @TextColumn() name: string

  @JsonColumn() plan: DesignPlan

  @JsonColumn() result: DesignResult

  @JsonColumn() resolvedWith: ResolvedWith

  @TextColumn() calculationVersion: string

  @VersionColumn() version: number

  @ReferenceColumn() designerId: string

  @InstantColumn() createdAt: Date

  @InstantColumn() updatedAt: Date
}
