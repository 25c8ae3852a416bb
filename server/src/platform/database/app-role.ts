import { QueryFailedError, type QueryRunner } from 'typeorm'

const attributes = 'login nosuperuser nocreatedb nocreaterole nobypassrls'

/** What PostgreSQL says when two make or change one role at once: unique_violation, duplicate_object, internal_error. */
const clashes = ['23505', '42710', 'XX000']
const mostTries = 5

/**
 * Makes the role the server runs as, or gives it today's password. Roles belong to the whole cluster, where another
 * database may be migrated at this very moment: whoever loses looks again.
 */
export async function ensureAppRole(runner: QueryRunner, password: string): Promise<void> {
  for (let tries = 1; ; tries += 1) {
    try {
      return await makeOrChange(runner, password)
    } catch (error) {
      if (tries === mostTries || !isClash(error)) throw error
    }
  }
}

async function makeOrChange(runner: QueryRunner, password: string): Promise<void> {
  const [found] = await runner.query("select 1 from pg_roles where rolname = 'wadestone_app'")
  const verb = found === undefined ? 'create' : 'alter'
  // A role statement takes no parameters, so the database itself quotes the password.
  const [{ statement }] = await runner.query(
    `select format('${verb} role wadestone_app ${attributes} password %L', $1::text) as statement`,
    [password],
  )
  await runner.query(statement)
}

function isClash(error: unknown): boolean {
  if (!(error instanceof QueryFailedError)) return false
  const { driverError } = error
  return 'code' in driverError && clashes.includes(String(driverError.code))
}
