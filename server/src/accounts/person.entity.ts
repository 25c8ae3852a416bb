import { Entity, Unique } from 'typeorm'
import { FlagColumn, IdColumn, InstantColumn, TextColumn } from '../platform/database/columns.js'

/** A human being. Belongs to no district; memberships say where and as what. */
@Entity('people')
@Unique(['email'])
export class Person {
  @IdColumn() id: string

  @TextColumn() name: string

  @TextColumn() email: string

  @TextColumn({ nullable: true }) passwordHash: string | null

  @FlagColumn({ default: true }) isActive: boolean

  @InstantColumn() createdAt: Date
}
