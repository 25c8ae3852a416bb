import { DataSource, type EntityManager } from 'typeorm'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { asOwnerIn, districtTables } from './support/rows-of-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk } from './support/walk'

let app: TestApp
let own: ReadyDistrict
let other: ReadyDistrict
let tables: string[]
/** As the role of the server, with nothing set. */
let server: DataSource

/** A variance is the one thing of a job that no route writes yet. */
const neverWritten = ['variances']

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  own = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Tarn Hollow District (example)')
  for (const district of [own, other]) {
    const walk = new Walk(app, district)
    const walked = await walk.draft(`producer.${district.districtId.slice(0, 8)}@farms.example`)
    const { planner } = district
    await planner.api.post(`/jobs/${walked.job.id}/notes`, { text: 'Look at the gate.' }).expect(201)
    await walk.settleNotes(walked)
    await walk.approved(walked)
  }
  tables = districtTables(app.database.owner)
  server = app.nest.get(DataSource)
})
afterAll(() => app.stop())

const inOwn = <T>(work: (manager: EntityManager) => Promise<T>): Promise<T> =>
  app.inDistrict(own.districtId, ({ manager }) => work(manager))

/** The tables of a district in which somebody sees a row. */
async function seen(by: Pick<EntityManager, 'query'>, where = 'true'): Promise<string[]> {
  const filled: string[] = []
  for (const table of tables) {
    if ((await by.query(`select 1 from ${table} where ${where} limit 1`)).length > 0) filled.push(table)
  }
  return filled
}

describe('row security', () => {
  it('stands forced on every table, and no table is without a policy', async () => {
    const bare = await app.database.owner.query(
      `select c.relname from pg_class c join pg_namespace n on n.oid = c.relnamespace
       where n.nspname = 'public' and c.relkind in ('r', 'p') and c.relname <> 'migrations' and not (
         c.relrowsecurity and c.relforcerowsecurity
         and exists (select 1 from pg_policy p where p.polrelid = c.oid)
       )`,
    )
    expect(bare).toEqual([])
    expect(tables.length).toBeGreaterThan(25)
  })

  it('shows the server no row of any table before a district is set', async () => {
    expect(await seen(server)).toEqual([])
    for (const table of ['districts', 'people', 'sign_in_attempts']) {
      expect(await server.query(`select * from ${table}`)).toEqual([])
    }
  })

  it('shows the rows of the district that is set, and none of another in any table', async () => {
    const written = tables.filter((table) => !neverWritten.includes(table))
    expect(await inOwn(seen)).toEqual(written)
    expect(await app.inDistrict(other.districtId, ({ manager }) => seen(manager))).toEqual(written)
    expect(await inOwn((manager) => seen(manager, `district_id <> '${own.districtId}'`))).toEqual([])
    const districts = await inOwn((manager) => manager.query('select id from districts'))
    expect(districts).toEqual([{ id: own.districtId }])
  })

  it('shows people of the district that is set alone', async () => {
    const people: { id: string }[] = await inOwn((manager) => manager.query('select id from people'))
    const ids = people.map(({ id }) => id)
    expect(ids).toContain(own.planner.personId)
    expect(ids).not.toContain(other.planner.personId)
  })

  it('lets no row be written into another district', async () => {
    const { districtId, planner } = other
    const insert = `insert into notes
      (district_id, id, job_id, text, author_id, author_role, written_at, status)
      select $1, gen_random_uuid(), id, 'Not mine.', $2, 'planner', now(), 'open' from jobs limit 1`
    const written = inOwn((manager) => manager.query(insert, [districtId, planner.personId]))
    await expect(written).rejects.toThrow('violates row-level security policy')
    const changed = inOwn((manager) => manager.query('update jobs set district_id = $1', [districtId]))
    await expect(changed).rejects.toThrow('violates row-level security policy')
    const [, touched] = await inOwn((manager) =>
      manager.query(`update jobs set title = 'Taken' where district_id = $1`, [districtId]),
    )
    expect(touched).toBe(0)
  })

  it('ends with the transaction, so that the next one on the same connection sees nothing', async () => {
    await Promise.all(
      Array.from({ length: 20 }, () => inOwn((manager) => manager.query('select 1 from jobs'))),
    )
    const answers = await Promise.all(Array.from({ length: 20 }, () => server.query('select id from jobs')))
    expect(answers.flat()).toEqual([])
  })
})

describe('the role of the server', () => {
  const refused = async (statement: string) =>
    expect([statement, await inOwn((manager) => manager.query(statement)).catch(String)]).toEqual([
      statement,
      expect.stringMatching(/permission denied|must be owner/),
    ])

  it.each(['events', 'files', 'revisions'])('cannot change, delete or empty %s', async (table) => {
    await refused(`update ${table} set district_id = district_id`)
    await refused(`delete from ${table}`)
    await refused(`truncate ${table}`)
  })

  it('cannot make, change or drop a table, a policy, a function or a role', async () => {
    await refused('create table mine (id int)')
    await refused('alter table jobs disable row level security')
    await refused('drop policy jobs_of_district on jobs')
    await refused('alter table events disable trigger events_written_once')
    await refused(`create function public.mine() returns int language sql as 'select 1'`)
    await refused('create role mine')
    await refused('drop table notes')
    await refused('delete from migrations')
  })

  it('has no way around row security', async () => {
    const [role] = await server.query(
      'select rolsuper or rolbypassrls or rolcreaterole or rolcreatedb as mighty from pg_roles where rolname = current_user',
    )
    expect(role).toEqual({ mighty: false })
    const memberOf = await server.query(
      `select r.rolname from pg_auth_members m join pg_roles r on r.oid = m.roleid
       join pg_roles u on u.oid = m.member where u.rolname = current_user`,
    )
    expect(memberOf).toEqual([])
  })
})

describe('what is written once', () => {
  it.each(['events', 'files', 'revisions'])(
    'the owner cannot change, delete or empty in %s either',
    async (table) => {
      const asOwner = (statement: string) =>
        asOwnerIn(app.database.owner, own.districtId, (manager) => manager.query(statement))
      const words = `rows of ${table} are written once`
      await expect(asOwner(`update ${table} set district_id = district_id`)).rejects.toThrow(words)
      await expect(asOwner(`delete from ${table}`)).rejects.toThrow(words)
      await expect(asOwner(`truncate ${table} cascade`)).rejects.toThrow(words)
    },
  )
})

describe('the migrations', () => {
  it('make the very tables that the entities describe', async () => {
    const { upQueries } = await app.database.owner.driver.createSchemaBuilder().log()
    expect(upQueries.map(({ query }) => query)).toEqual([])
  })
})
