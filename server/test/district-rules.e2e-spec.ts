import type { SettingsView } from 'shared'
import { readExample } from './support/example'
import { expectProblem, pointersOf } from './support/expect-problem'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walked: Walked

const { job: example } = readExample('north-pond')
const [fund] = example.schedules

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walked = await new Walk(app, district).draft()
})
afterAll(() => app.stop())

const askForPacket = () =>
  district.planner.api.act(`/jobs/${walked.job.id}/packets`, { designId: walked.designId })

async function saveSetting(key: string, value: number | null): Promise<void> {
  const { api } = district.administrator
  const { version }: SettingsView = (await api.get('/settings').expect(200)).body
  const given = { key, value, source: 'soil report 7', sourceDate: '2026-03-02' }
  await api.put('/settings', { settings: [given] }, { version }).expect(200)
}

async function putInForce(change: object): Promise<void> {
  const { api } = district.office
  const schedule = { ...fund, effectiveTo: '2126-09-30', ...change }
  const { id } = (await api.post('/schedules', schedule).expect(201)).body
  await api.act(`/schedules/${id}/put-in-force`).expect(200)
}

const isRefused = async (slug: 'setting-missing' | 'schedule-not-mapped') => {
  const problem = expectProblem(await askForPacket(), slug)
  const { packetId, revisions, state } = await new Walk(app, district).read(walked.job.id)
  expect({ packetId, revisions, state }).toEqual({ packetId: null, revisions: [], state: 'draft' })
  return problem
}

describe('a packet', () => {
  it('is not made while a setting that it needs is empty, and the setting is named', async () => {
    await saveSetting('swellPercent', null)
    const problem = await isRefused('setting-missing')
    expect(pointersOf(problem)).toEqual(['/settings/swellPercent'])
    expect(problem.detail).toMatch(
      /^The setting ".+" is still empty\. An administrator fills it under Settings\.$/,
    )
    await saveSetting('swellPercent', 25)
  })

  it('is not made while its fund has no line for what the design counts on', async () => {
    const lines = fund!.lines.map((line) =>
      line.quantityKey === 'stone-base' ? { ...line, quantityKey: null } : line,
    )
    await putInForce({ lines })
    const problem = await isRefused('schedule-not-mapped')
    expect(pointersOf(problem)).toEqual(['/funding/sources/0/contracted/stone-base'])
    expect(problem.detail).toContain(fund?.name)
  })

  it('is not made while its fund is over', async () => {
    await putInForce({ effectiveTo: '2126-09-30' })
    await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query(
        `update payment_schedules set effective_to = effective_from where key = $1 and status = 'in-force'`,
        [fund?.key],
      ),
    )
    const problem = await isRefused('schedule-not-mapped')
    expect(pointersOf(problem)).toEqual(['/funding/sources/0/scheduleKey'])
  })

  it('is made once setting and fund are whole, and keeps the rules it was made with', async () => {
    await putInForce({})
    const { body: packet } = await askForPacket().expect(202)
    await saveSetting('swellPercent', 40)
    await app.drain()
    const { body } = await district.planner.api.get(`/packets/${packet.id}`).expect(200)
    expect(body.status).toBe('ready')
    const [revision] = await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query('select result, schedule_ids from revisions where job_id = $1', [walked.job.id]),
    )
    expect(revision.result.earthwork.value.balance.swellPercent).toBe(25)
    expect(revision.schedule_ids).toHaveLength(2)
  })
})
