import type pg from 'pg'

/** The name by which a server's queue connections are known in the database. */
export const queueConnectionName = 'wadestone-queue'

/** No task of ours takes nearly as long; a lock as old as this is left from a process that was killed. */
const deadAfter = '10 minutes'

const othersAlive = `
  select exists (
    select 1 from pg_stat_activity
    where application_name = $1 and pid <> pg_backend_pid() and datname = current_database()
  ) as "othersAlive"
`

const lockedBy = `
  select coalesce(array_agg(distinct locked_by), '{}') as workers
  from graphile_worker._private_jobs
  where locked_by is not null and ($1 or locked_at < now() - interval '${deadAfter}')
`

/**
 * The queue waits four hours before it takes a task from a worker that was killed. Nobody waits so long for a
 * packet: when no other server is there every lock is a dead one, and else the old ones are.
 */
export async function unlockDead(pool: pg.Pool): Promise<void> {
  const client = await pool.connect()
  try {
    const alive = await client.query<{ othersAlive: boolean }>(othersAlive, [queueConnectionName])
    const isAlone = alive.rows[0]?.othersAlive === false
    const locked = await client.query<{ workers: string[] }>(lockedBy, [isAlone])
    const workers = locked.rows[0]?.workers ?? []
    if (workers.length > 0) await client.query('select graphile_worker.force_unlock_workers($1)', [workers])
  } finally {
    client.release()
  }
}
