import type { QueryRunner } from 'typeorm'

/**
 * The queue's tables have row security without a policy, which shows nothing to anyone but their owner.
 * The server's role is let in here; it may use the queue and not change its shape.
 */
export async function grantQueue(runner: QueryRunner): Promise<void> {
  await runner.query('grant usage on schema graphile_worker to wadestone_app')
  await runner.query('grant execute on all functions in schema graphile_worker to wadestone_app')
  await runner.query('grant usage, select on all sequences in schema graphile_worker to wadestone_app')
  const tables: { name: string; hasPolicy: boolean }[] = await runner.query(
    `select t.tablename as name, exists (
       select 1 from pg_policies p
       where p.schemaname = t.schemaname and p.tablename = t.tablename and p.policyname = 'wadestone_app'
     ) as "hasPolicy"
     from pg_tables t where t.schemaname = 'graphile_worker'`,
  )
  await runner.query(
    'grant select, insert, update, delete on all tables in schema graphile_worker to wadestone_app',
  )
  for (const { name, hasPolicy } of tables) {
    if (hasPolicy) continue
    await runner.query(
      `create policy wadestone_app on graphile_worker.${name} to wadestone_app using (true) with check (true)`,
    )
  }
}
