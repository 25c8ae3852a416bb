import { makeTestDatabase } from './support/test-database'

describe('the role of the server', () => {
  it('is made once, though several databases of one cluster are migrated at the same time', async () => {
    const databases = await Promise.all(Array.from({ length: 4 }, () => makeTestDatabase()))
    try {
      const [first] = databases
      const roles = await first?.owner.query(
        "select rolsuper, rolcreatedb, rolbypassrls from pg_roles where rolname = 'wadestone_app'",
      )
      expect(roles).toEqual([{ rolsuper: false, rolcreatedb: false, rolbypassrls: false }])
    } finally {
      for (const database of databases) await database.drop()
    }
  })
})
