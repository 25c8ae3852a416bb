import type { TestApp } from './test-app'

/** Does all that waits, also what failed before and would be tried again later only. */
export async function drainAgain(app: TestApp): Promise<void> {
  await app.database.owner.query('update graphile_worker._private_jobs set run_at = now()')
  await app.drain()
}

export const waitingTasks = async ({ database }: TestApp): Promise<number> =>
  (
    await database.owner.query(
      'select count(*)::int as count from graphile_worker._private_jobs where attempts < max_attempts',
    )
  )[0].count
