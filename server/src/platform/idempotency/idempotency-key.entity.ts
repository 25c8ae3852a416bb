import { Entity, Index } from 'typeorm'
import {
  DistrictIdColumn,
  IdColumn,
  IdTextColumn,
  InstantColumn,
  JsonColumn,
  TextColumn,
} from '../database/columns.js'

/** The answer of an act, kept so that a repeated request gets it again instead of acting twice. */
@Entity('idempotency_keys')
@Index(['createdAt'])
export class IdempotencyKey {
  @DistrictIdColumn() districtId: string

  @IdColumn() personId: string

  @IdTextColumn() key: string

  @TextColumn() fingerprint: string

  @JsonColumn({ nullable: true }) answer: unknown | null

  @InstantColumn() createdAt: Date
}
