import { runMigrations } from 'graphile-worker'
import type { DataSource } from 'typeorm'
import { ensureAppRole } from './app-role.js'
import { grantQueue } from '../queue/grant-queue.js'

/** Any number of servers may be started at once; only one of them migrates, the others wait for it. */
const migrationLock = 735_001

export interface MigrateInput {
  dataSource: DataSource
  url: string
  /** Sets the password of the server's role; left out where the role is looked after elsewhere. */
  appPassword?: string
}

export async function migrate({ dataSource, url, appPassword }: MigrateInput): Promise<void> {
  const runner = dataSource.createQueryRunner()
  await runner.query('select pg_advisory_lock($1)', [migrationLock])
  try {
    if (appPassword !== undefined) await ensureAppRole(runner, appPassword)
    await dataSource.runMigrations()
    await runMigrations({ connectionString: url })
    await grantQueue(runner)
  } finally {
    await runner.query('select pg_advisory_unlock($1)', [migrationLock])
    await runner.release()
  }
}
