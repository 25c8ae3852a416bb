import { Entity } from 'typeorm'
import type { EventFacts } from './event-facts.js'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  PositionColumn,
  ReferenceColumn,
  TextColumn,
} from '../database/columns.js'

/** What happened, append-only. Ids, hashes and numbers only: a name is looked up when the row is read. */
@Entity('events')
export class EventRow {
  @DistrictIdColumn() districtId: string

  /** The job, or the district itself for what concerns no job. */
  @IdColumn() streamId: string

  @PositionColumn() sequence: number

  @TextColumn() kind: string

  @ReferenceColumn({ nullable: true }) actorId: string | null

  @InstantColumn() at: Date

  @JsonColumn() facts: EventFacts

  @TextColumn() previousHash: string

  @TextColumn() rowHash: string
}
