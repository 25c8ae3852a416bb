import { Entity, Index } from 'typeorm'
import type { ProducerInput } from 'shared'
import {
  DistrictIdColumn,
  IdColumn,
  InstantColumn,
  JsonColumn,
  ReferenceColumn,
  TextColumn,
  VersionColumn,
} from '../platform/database/columns.js'
import { RefersToGlobal, RefersToKey } from '../platform/database/references.js'

/** A livestock producer. With an e-mail also a person who can sign. */
@Entity('producers')
@Index(['districtId', 'personId'])
@RefersToGlobal('districts', 'districtId')
@RefersToKey('memberships', 'personId')
export class Producer {
  @DistrictIdColumn() districtId: string

  @IdColumn() id: string

  @ReferenceColumn({ nullable: true }) personId: string | null

  @TextColumn() name: string

  @TextColumn() farmName: string

  @TextColumn({ nullable: true }) email: string | null

  @TextColumn({ nullable: true }) phone: string | null

  @JsonColumn({ nullable: true }) address: ProducerInput['address'] | null

  @VersionColumn() version: number

  @InstantColumn() createdAt: Date

  @InstantColumn() updatedAt: Date
}
