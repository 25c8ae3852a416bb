import { Entity } from 'typeorm'
import { CountColumn, IdTextColumn, InstantColumn } from '../platform/database/columns.js'

/** Failed sign-ins of one account or from one address. The key is a keyed hash, never the e-mail or address itself. */
@Entity('sign_in_attempts')
export class SignInAttempt {
  @IdTextColumn() key: string

  @CountColumn() failures: number

  @InstantColumn() lastTriedAt: Date

  @InstantColumn({ nullable: true }) blockedUntil: Date | null
}
