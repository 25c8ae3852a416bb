import type { MigrationInterface, QueryRunner } from 'typeorm'
import { accountsTables } from './first/accounts-tables.js'
import { appRole } from './first/app-role.js'
import { districtsTables } from './first/districts-tables.js'
import { foreignKeys } from './first/foreign-keys.js'
import { jobsTables } from './first/jobs-tables.js'
import { packetsTables } from './first/packets-tables.js'
import { platformTables } from './first/platform-tables.js'
import { rowSecurity } from './first/row-security.js'

export class First1780000000000 implements MigrationInterface {
  name = 'First1780000000000'

  async up(runner: QueryRunner): Promise<void> {
    const statements = [
      ...accountsTables,
      ...districtsTables,
      ...jobsTables,
      ...packetsTables,
      ...platformTables,
      ...foreignKeys,
      ...rowSecurity,
      ...appRole,
    ]
    for (const statement of statements) await runner.query(statement)
  }

  /** There is nothing before the first release to go back to. */
  async down(): Promise<void> {
    throw new Error('The first migration cannot be undone. Restore a backup instead.')
  }
}
