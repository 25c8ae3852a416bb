import type { ScheduleInput, ScheduleListItem, ScheduleView } from 'shared'
import { EventLog } from '../src/platform/events/event-log.service'
import { readExample } from './support/example'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'

let app: TestApp
let district: ReadyDistrict
let other: ReadyDistrict

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Tarn Hollow District (example)')
})
afterAll(() => app.stop())

const line = {
  code: 'T-01',
  practice: '561',
  title: 'Stone, in place',
  unit: 'Tons',
  baseRate: '24.5',
  higherRate: '28.8125',
  quantityKey: null,
}

const fund = (change: Partial<ScheduleInput> = {}): ScheduleInput => ({
  key: 'test-fund',
  name: 'Test fund (example)',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2125-09-30',
  lines: [line, { ...line, code: 'T-02' }],
  ...change,
})

const made = async (change: Partial<ScheduleInput> = {}): Promise<ScheduleView> =>
  (await district.office.api.post('/schedules', fund(change)).expect(201)).body

const inForce = (id: string) => district.office.api.act(`/schedules/${id}/put-in-force`)

const map = ({ id, version }: ScheduleView, code: string, quantityKey: string | null) =>
  district.office.api.put(`/schedules/${id}/mapping`, { mapping: [{ code, quantityKey }] }, { version })

const pointersOf = (body: { fields: { pointer: string }[] }): string[] =>
  body.fields.map(({ pointer }) => pointer)

describe('a draft of a payment schedule', () => {
  it('is read as it was written, line by line, and listed with its count of unmapped lines', async () => {
    const schedule = await made({
      practices: ['561'],
      cap: '4500.00' as ScheduleInput['cap'],
      advancePercent: 50,
    })
    const { body } = await district.planner.api.get(`/schedules/${schedule.id}`).expect(200)
    expect(body).toEqual(schedule)
    expect(body).toMatchObject({ status: 'draft', version: 1, practices: ['561'], cap: '4500.00' })
    expect(body.lines[0]).toEqual({ ...line, baseRate: '24.50' })
    const list: ScheduleListItem[] = (await district.planner.api.get('/schedules').expect(200)).body
    expect(list.find(({ id }) => id === schedule.id)).toMatchObject({ lines: 2, unmappedLines: 2 })
  })

  it('is written anew as a whole by the version seen', async () => {
    const { id } = await made({ cap: '4500.00' as ScheduleInput['cap'] })
    const { api } = district.office
    const lines = [{ ...line, code: 'T-02', quantityKey: 'stone-base' }]
    const { body } = await api.put(`/schedules/${id}`, fund({ lines }), { version: 1 }).expect(200)
    expect(body).toMatchObject({ version: 2, lines: [{ code: 'T-02', quantityKey: 'stone-base' }] })
    expect(body.lines).toHaveLength(1)
    expect(body).not.toHaveProperty('cap')
    const stale = await api.put(`/schedules/${id}`, fund(), { version: 1 }).expect(412)
    expect(stale.body.current).toEqual(body)
  })

  it('is mapped a line at a time, and two mappers at once cannot both win', async () => {
    const schedule = await made()
    const answers = await Promise.all([
      map(schedule, 'T-01', 'stone-base'),
      map(schedule, 'T-02', 'stone-base'),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412])
    const now: ScheduleView = (await district.office.api.get(`/schedules/${schedule.id}`)).body
    expect(now.version).toBe(2)
    const free = now.lines.find(({ quantityKey }) => quantityKey === null)?.code ?? ''
    const twice = await map(now, free, 'stone-base').expect(422)
    expect(pointersOf(twice.body)).toEqual(['/mapping/0/quantityKey'])
    await map(now, free, 'stone-surface').expect(200)
  })

  it('with lines that cannot be is refused beside each', async () => {
    const lines = [line, { ...line, quantityKey: 'berm' }, { ...line, code: 'T-03', quantityKey: 'gravel' }]
    const { body } = await district.office.api.post('/schedules', fund({ lines })).expect(422)
    expect(pointersOf(body)).toEqual(['/lines/1/code', '/lines/1/quantityKey', '/lines/2/quantityKey'])
  })

  it('takes as many lines as a schedule may have', async () => {
    const lines = Array.from({ length: 2000 }, (_, index) => ({ ...line, code: `L-${index}` }))
    expect((await made({ lines })).lines).toHaveLength(2000)
  })

  it('is seen by its own district alone, and written by office and administrator alone', async () => {
    const { id } = await made()
    await other.office.api.get(`/schedules/${id}`).expect(404)
    await other.office.api.put(`/schedules/${id}`, fund(), { version: 1 }).expect(404)
    await other.office.api.act(`/schedules/${id}/put-in-force`).expect(404)
    await district.planner.api.post('/schedules', fund()).expect(403)
    await district.administrator.api.post('/schedules', fund()).expect(201)
  })
})

describe('a payment schedule in force', () => {
  it('takes the place of the one with its key, and of no other', async () => {
    const mapped = { lines: [{ ...line, quantityKey: 'stone-base' }] }
    const [first, second] = [await made(mapped), await made({ ...mapped, fiscalYear: 2027 })]
    await inForce(first.id).expect(200)
    const { body } = await inForce(second.id).expect(200)
    expect(body).toMatchObject({ id: second.id, status: 'in-force', version: 2 })
    const list: ScheduleListItem[] = (await district.office.api.get('/schedules')).body
    const status = new Map(list.map((item) => [item.id, item.status]))
    expect(status.get(first.id)).toBe('retired')
    for (const { key } of readExample('north-pond').job.schedules) {
      expect(list.find((item) => item.key === key)?.status).toBe('in-force')
    }
  })

  it('is not edited, not mapped and not put in force again', async () => {
    const schedule = await made({ key: 'kept-fund', lines: [{ ...line, quantityKey: 'stone-base' }] })
    const { id, version, lines }: ScheduleView = (await inForce(schedule.id).expect(200)).body
    const { api } = district.office
    const answers = [
      await api.put(`/schedules/${id}`, fund(), { version }),
      await map({ ...schedule, version }, 'T-01', null),
      await inForce(id),
    ]
    for (const { status, body } of answers) {
      expect([status, body.type]).toEqual([409, 'urn:wadestone:problem:already-in-use'])
    }
    expect((await api.get(`/schedules/${id}`)).body).toMatchObject({ version, lines })
  })

  it('must pay something: one by the unit with no line mapped stays a draft, and the one before stays', async () => {
    const before = await made({ key: 'mapped-fund', lines: [{ ...line, quantityKey: 'stone-base' }] })
    await inForce(before.id).expect(200)
    const { id } = await made({ key: 'mapped-fund' })
    const { body } = await inForce(id).expect(422)
    expect(body.type).toBe('urn:wadestone:problem:schedule-not-mapped')
    const statuses = [before.id, id].map(
      async (one) => (await district.office.api.get(`/schedules/${one}`)).body.status,
    )
    expect(await Promise.all(statuses)).toEqual(['in-force', 'draft'])
  })

  it('must be made for today', async () => {
    const { id } = await made({ effectiveFrom: '2001-10-01', effectiveTo: '2002-09-30' })
    expect(pointersOf((await inForce(id).expect(422)).body)).toEqual(['/effectiveTo'])
  })

  it('leaves events with ids and versions, in an unbroken chain', async () => {
    const schedule = await made({ key: 'told-fund' })
    await map(schedule, 'T-01', 'stone-base').expect(200)
    await inForce(schedule.id).expect(200)
    const events = await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query(
        `select kind, facts from events where stream_id = $1 and facts->>'scheduleId' = $2 order by sequence`,
        [district.districtId, schedule.id],
      ),
    )
    expect(events).toEqual([
      { kind: 'schedule-made', facts: { scheduleId: schedule.id, version: 1 } },
      { kind: 'schedule-mapped', facts: { scheduleId: schedule.id, version: 2 } },
      { kind: 'schedule-in-force', facts: { scheduleId: schedule.id, version: 3, retiredId: null } },
    ])
    const { districtId } = district
    const log = app.nest.get(EventLog, { strict: false })
    expect(await app.inDistrict(districtId, (tx) => log.verify(tx, districtId))).toMatchObject({
      isIntact: true,
    })
  })
})

describe('a schedule from a file', () => {
  const read = (content: string) => district.office.api.upload('/schedules/read-csv', 'schedule.csv', content)

  it('comes back as lines and faults, and is not kept', async () => {
    const count = (await district.office.api.get('/schedules')).body.length
    const { body } = await read(
      'code,practice,title,unit,base_rate\nA1,561,Stone,ton,$24\nA2,561,,ton,1',
    ).expect(200)
    expect(body.lines).toEqual([
      { code: 'A1', practice: '561', title: 'Stone', unit: 'ton', baseRate: '24', quantityKey: null },
    ])
    expect(body.errors).toMatchObject([{ row: 3, column: 'title' }])
    expect((await district.office.api.get('/schedules')).body).toHaveLength(count)
  })

  it('that is no schedule is refused as a file', async () => {
    const { body } = await read('dear office, here are the rates').expect(422)
    expect(body.type).toBe('urn:wadestone:problem:unreadable-file')
    expect(pointersOf(body)).toEqual(['/file'])
  })
})
