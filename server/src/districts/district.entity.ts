import { Entity, Unique } from 'typeorm'
import { CountColumn, FlagColumn, IdColumn, InstantColumn, TextColumn } from '../platform/database/columns.js'

/** A conservation district. Nothing of one is ever visible in another. */
@Entity('districts')
@Unique(['name'])
export class District {
  @IdColumn() id: string

  @TextColumn() name: string

  @TextColumn() timeZone: string

  @CountColumn() fiscalYearStartMonth: number

  @TextColumn() jobNumberPrefix: string

  @CountColumn({ default: 1 }) nextJobNumber: number

  /** May one person make the technical check and approve? */
  @FlagColumn({ default: false }) checkerMayApprove: boolean

  @FlagColumn({ default: false }) isDemo: boolean

  @CountColumn({ default: 0 }) settingsVersion: number

  @InstantColumn() createdAt: Date
}
