import { Entity, Index, Unique } from 'typeorm'
import type { JobInput, JobState, Money } from 'shared'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  MoneyColumn,
  NumberColumn,
  ReferenceColumn,
  TextColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersTo, RefersToGlobal } from '../platform/database/references.js'

/** One watering ramp for one or more producers, from first visit to the end of its life. */
@Entity('jobs')
@Unique(['districtId', 'number'])
@Index(['districtId', 'updatedAt', 'id'])
@Index(['districtId', 'state', 'updatedAt', 'id'])
@RefersToGlobal('districts', 'districtId')
@RefersTo('designs', 'chosenDesignId')
@RefersTo('packets', 'packetId')
@RefersTo('packets', 'finalPacketId')
export class Job {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @TextColumn() number: string

  @TextColumn() title: string

  @TextColumn() state: JobState

  @VersionColumn() version: number

  @TextColumn() body: JobInput['body']

  @TextColumn() waterName: string

  @TextColumn() county: string

  @TextColumn({ nullable: true }) farmNumber: string | null

  @TextColumn({ nullable: true }) tractNumber: string | null

  @TextColumn({ nullable: true }) fieldNumber: string | null

  @TextColumn({ nullable: true }) legalDescription: string | null

  @ReferenceColumn({ nullable: true }) chosenDesignId: string | null

  /** Packet A of the chosen design as it stands; null once the design moves on. */
  @ReferenceColumn({ nullable: true }) packetId: string | null

  @ReferenceColumn({ nullable: true }) finalPacketId: string | null

  /** Number, title, water and producers in small letters, for the list. */
  @TextColumn({ default: '' }) searchText: string

  /** The next three show in the list and follow the chosen design. */
  @NumberColumn({ nullable: true }) gradeRunPerRise: number | null

  @NumberColumn({ nullable: true }) stoneOrderTons: number | null

  @MoneyColumn({ nullable: true }) landownerShare: Money | null

  @ReferenceColumn() createdBy: string

  @InstantColumn() createdAt: Date

  @InstantColumn() updatedAt: Date

  @InstantColumn() stateSince: Date
}
