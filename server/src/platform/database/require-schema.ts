import type { DataSource } from 'typeorm'

/** A server must not work on tables older than it knows: it would write half of what it means. */
export async function requireSchema(dataSource: DataSource): Promise<void> {
  if (await dataSource.showMigrations()) {
    throw new Error(
      'The database is older than this server. Run the migrations first: node server/dist/migrate.js',
    )
  }
}

/** A role that may bypass row security would see every district at once. */
export async function requirePlainRole(dataSource: DataSource): Promise<void> {
  const [role] = await dataSource.query(
    'select rolsuper or rolbypassrls as "isMighty" from pg_roles where rolname = current_user',
  )
  if (role.isMighty) {
    throw new Error(
      'The server must not run as a role that bypasses row security. Use the role wadestone_app.',
    )
  }
}
