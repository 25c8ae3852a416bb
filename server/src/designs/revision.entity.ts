import { Entity, Unique } from 'typeorm'
import type { DesignPlan, DesignResult, SettingValue, SurveyInput } from 'shared'
import {
  CountColumn,
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  TextColumn,
} from '../platform/database/columns.js'
import { RefersTo } from '../platform/database/references.js'

/** A design frozen for a packet. The database lets nobody change or delete it. */
@Entity('revisions')
@Unique(['districtId', 'jobId', 'number'])
@RefersTo('jobs', 'jobId')
@RefersTo('designs', 'designId')
@RefersTo('criteria_sets', 'criteriaSetId')
@RefersTo('cost_lists', 'costListId')
export class Revision {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn() jobId: string

  @ReferenceColumn() designId: string

  @CountColumn() designVersion: number

  @CountColumn() number: number

  @JsonColumn() survey: SurveyInput

  @JsonColumn() plan: DesignPlan

  @JsonColumn() result: DesignResult

  @TextColumn() calculationVersion: string

  @ReferenceColumn({ nullable: true }) criteriaSetId: string | null

  @ReferenceColumn({ nullable: true }) costListId: string | null

  @ReferenceColumn({ array: true }) scheduleIds: string[]

  /** Those that were entered, as they stood. */
  @JsonColumn() settings: SettingValue[]

  @ReferenceColumn() designerId: string

  @ReferenceColumn() madeBy: string

  @InstantColumn() madeAt: Date
}
