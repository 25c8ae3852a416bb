import { DataSource } from 'typeorm'
import { UnitOfWork } from '../src/platform/database/unit-of-work'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { districtTables, rowsOf } from './support/rows-of-district'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk } from './support/walk'

let app: TestApp
let own: ReadyDistrict
let other: ReadyDistrict
let tables: string[]
/** As the server's role, with nothing set. */
let server: DataSource

/** A variance is the one thing of a job that no route writes yet. */
const neverWritten = ['variances']

beforeAll(async () => {
  app = await startTestApp()
  own = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Tarn Hollow District (example)')
  for (const district of [own, other]) {
    const walk = new Walk(app, district)
    const walked = await walk.draft(`producer.${district.districtId.slice(0, 8)}@farms.example`)
    await walk.approved(walked)
    await district.planner.api.post(`/jobs/${walked.job.id}/notes`, { text: 'Look at the gate.' }).expect(201)
    await walk.settleNotes(walked)
  }
  tables = districtTables(app.database.owner)
  server = app.nest.get(DataSource)
})
afterAll(() => app.stop())

const counted = async (run: (sql: string) => Promise<{ count: number }[]>, where = ''): Promise<Map<string, number>> => {
  const counts = new Map<string, number>()
  for (const table of tables) {
    counts.set(table, (await run(`select count(*)::int as count from ${table} ${where}`))[0]?.count ?? -1)
  }
  return counts
}

const inOwn = <T>(work: (run: (sql: string, given?: unknown[]) => Promise<T>) => Promise<T>): Promise<T> =>
  app.nest
    .get(UnitOfWork)
    .run({ personId: null, districtId: own.districtId }, ({ manager }) =>
      work((sql, given) => manager.query(sql, given)),
    )

const withRows = (counts: Map<string, number>): string[] =>
  [...counts].filter(([, count]) => count > 0).map(([table]) => table)

describe('row security', () => {
  it('stands on every table, binds the owner too, and no table is without a policy', async () => {
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

  it('shows no row of any table to the server before a district is set', async () => {
    expect(withRows(await counted((sql) => server.query(sql)))).toEqual([])
    for (const table of ['districts', 'people', 'sign_in_attempts']) {
      expect(await server.query(`select * from ${table}`)).toEqual([])
    }
  })

  it('shows the rows of the district that is set in every table, and of no table those of another', async () => {
    const filled = withRows(await inOwn(async (run) => counted(run as never) as never)) as string[]
    expect(filled).toEqual(tables.filter((table) => !neverWritten.includes(table)))
    const foreign = `where district_id <> '${own.districtId}'`
    expect(withRows((await inOwn(async (run) => counted(run as never, foreign) as never)) as never)).toEqual([])
    expect(Object.values(await rowsOf(app.database.owner, other.districtId)).filter((rows) => rows.startsWith('0 '))).toHaveLength(
      neverWritten.length,
    )
  })
})
