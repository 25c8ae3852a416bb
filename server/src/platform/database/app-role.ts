import type { QueryRunner } from 'typeorm'

const attributes = 'login nosuperuser nocreatedb nocreaterole nobypassrls'

/** Makes the role the server runs as, or gives it today's password. */
export async function ensureAppRole(runner: QueryRunner, password: string): Promise<void> {
  const [found] = await runner.query("select 1 from pg_roles where rolname = 'wadestone_app'")
  const verb = found === undefined ? 'create' : 'alter'
  // A role statement takes no parameters, so the database itself quotes the password.
  const [{ statement }] = await runner.query(
    `select format('${verb} role wadestone_app ${attributes} password %L', $1::text) as statement`,
    [password],
  )
  await runner.query(statement)
}
