import request from 'supertest'
import type { ApiClient } from './support/api-client'
import { readExample } from './support/example'
import { expectProblem } from './support/expect-problem'
import { makeReadyDistrict, type ReadyDistrict, type Staff } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walked: Walked
let scheduleId: string

const { job: example, survey } = readExample('north-pond')
const [draftSchedule] = example.schedules

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walked = await new Walk(app, district).draft()
  scheduleId = (await district.office.api.post('/schedules', draftSchedule!).expect(201)).body.id
})
afterAll(() => app.stop())

interface Document {
  name: string
  by: Staff
  path: () => string
  /** What a person types; each mark makes it another. */
  typed: (mark: number) => object
}

const setting = (value: number) => ({
  key: 'swellPercent',
  value,
  source: 'soil report 7',
  sourceDate: '2026-03-02',
})

const documents: Document[] = [
  {
    name: 'a survey',
    by: 'planner',
    path: () => `/jobs/${walked.job.id}/survey`,
    typed: (mark) => ({ ...survey, startElevationFt: 104 + mark / 10 }),
  },
  {
    name: 'a design',
    by: 'planner',
    path: () => `/designs/${walked.designId}`,
    typed: (mark) => ({ name: `Design ${mark}`, plan: example.plan }),
  },
  {
    name: 'the settings',
    by: 'administrator',
    path: () => '/settings',
    typed: (mark) => ({ settings: [setting(20 + mark)] }),
  },
  {
    name: 'a producer',
    by: 'office',
    path: () => `/producers/${walked.producer.id}`,
    typed: (mark) => ({ ...example.producer, farmName: `Farm ${mark}` }),
  },
  {
    name: 'a payment schedule',
    by: 'office',
    path: () => `/schedules/${scheduleId}`,
    typed: (mark) => ({ ...draftSchedule, name: `Fund ${mark}` }),
  },
]

const versionOf = (etag: string): number => Number(/^"v(\d+)"$/.exec(etag)?.[1])

async function read(api: ApiClient, path: string): Promise<{ version: number; body: unknown }> {
  const { headers, body } = await api.get(path).expect(200)
  return { version: versionOf(headers['etag'] ?? ''), body }
}

describe.each(documents)('$name', ({ by, path, typed }) => {
  it('is saved by the version that was seen, and counts on by one', async () => {
    const { api } = district[by]
    const before = await read(api, path())
    const saved = await api.put(path(), typed(1), { version: before.version }).expect(200)
    expect(saved.headers['etag']).toBe(`"v${before.version + 1}"`)
    expect(await read(api, path())).toEqual({ version: before.version + 1, body: saved.body })
  })

  it('that somebody saved in between is refused with the newer one, which stays', async () => {
    const { api } = district[by]
    const { version } = await read(api, path())
    await api.put(path(), typed(2), { version }).expect(200)
    const newer = await read(api, path())
    for (const stale of [version, version - 1, version + 2]) {
      const problem = expectProblem(await api.put(path(), typed(3), { version: stale }), 'stale-version')
      expect(problem.current).toEqual(newer.body)
      expect(problem.detail).toMatch(/^Somebody|^Ines Varga saved version \d+/)
    }
    expect(await read(api, path())).toEqual(newer)
  })

  it('is saved by one of two who save at the same moment', async () => {
    const { api } = district[by]
    const { version } = await read(api, path())
    const answers = await Promise.all([4, 5].map((mark) => api.put(path(), typed(mark), { version })))
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412])
    const won = answers.find(({ status }) => status === 200)
    expect(await read(api, path())).toEqual({ version: version + 1, body: won?.body })
  })

  it('is not saved without a version, nor with one that is written otherwise', async () => {
    const { api } = district[by]
    const before = await read(api, path())
    expectProblem(await api.put(path(), typed(6)), 'version-required')
    for (const ifMatch of [`${before.version}`, `W/"v${before.version}"`, '*', '"v-1"', '"v1", "v2"']) {
      const answer = await request(app.nest.getHttpServer())
        .put(`/api${path()}`)
        .set({ Cookie: api.cookie, Origin: app.config.publicOrigin, 'X-Wadestone': '1', 'If-Match': ifMatch })
        .send(typed(6))
      expectProblem(answer, 'malformed-request')
    }
    expect(await read(api, path())).toEqual(before)
  })
})
