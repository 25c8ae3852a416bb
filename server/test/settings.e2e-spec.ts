import { randomUUID } from 'node:crypto'
import type { CostListView, CriteriaSetView, SettingsView, SettingValue } from 'shared'
import { publishedCriteriaInput } from '../src/districts/published-criteria-input'
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

const swell = (value: number | null): SettingValue => ({
  key: 'swellPercent',
  value,
  source: 'soil report 7',
  sourceDate: '2026-03-02',
})

const read = async (of: ReadyDistrict): Promise<SettingsView> =>
  (await of.planner.api.get('/settings').expect(200)).body

const valueOf = ({ settings }: SettingsView, wanted: string): number | null | undefined =>
  settings.find(({ key }) => key === wanted)?.value

describe('the settings', () => {
  it('are saved by the version seen, and leave the others and the other district alone', async () => {
    const before = await read(district)
    const { api } = district.administrator
    const saved = await api.put('/settings', { settings: [swell(31.5)] }, { version: before.version })
    expect(saved.status).toBe(200)
    expect(saved.headers.etag).toBe(`"v${before.version + 1}"`)
    expect(await read(district)).toEqual(saved.body)
    expect(valueOf(saved.body, 'swellPercent')).toBe(31.5)
    expect(valueOf(saved.body, 'shrinkPercent')).toBe(valueOf(before, 'shrinkPercent'))
    expect(valueOf(await read(other), 'swellPercent')).toBe(valueOf(before, 'swellPercent'))
  })

  it('of a stale version are refused with those of now, and of many savers at once one wins', async () => {
    const { api } = district.administrator
    const race = async (): Promise<number[]> => {
      const { version } = await read(district)
      const save = async (value: number) => api.put('/settings', { settings: [swell(value)] }, { version })
      const answers = await Promise.all([21, 22, 23, 24, 25, 26].map(save))
      const stale = answers.find(({ status }) => status === 412)
      expect(stale?.body.current).toEqual(await read(district))
      return answers.map(({ status }) => status).sort()
    }
    // Only once the first race has opened the connections do the others truly run side by side.
    for (let round = 1; round <= 4; round += 1) expect(await race()).toEqual([200, ...Array(5).fill(412)])
    await api.put('/settings', { settings: [swell(1)] }).expect(428)
  })

  it('may be emptied again', async () => {
    const { version } = await read(district)
    const save = { settings: [swell(null)] }
    const { body } = await district.administrator.api.put('/settings', save, { version }).expect(200)
    expect(valueOf(body, 'swellPercent')).toBeNull()
  })

  it('that are wrong are refused beside the field, and nothing of the request is kept', async () => {
    const before = await read(district)
    const settings = [swell(12), { ...swell(1), key: 'swelPercent' }, { ...swell(51), key: 'shrinkPercent' }]
    const { api } = district.administrator
    const { body } = await api.put('/settings', { settings }, { version: before.version }).expect(422)
    expect(body.fields.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '/settings/1/key',
      '/settings/2/value',
    ])
    expect(await read(district)).toEqual(before)
  })

  it('are written by the administrator alone', async () => {
    for (const { api } of [district.planner, district.office, district.supervisor]) {
      await api.put('/settings', { settings: [swell(1)] }, { version: 1 }).expect(403)
    }
  })

  it('leave an event that tells the version and no more', async () => {
    const { version } = await read(district)
    const events = await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query(`select facts from events where kind = 'settings-saved' order by sequence desc limit 1`),
    )
    expect(events).toEqual([{ facts: { version } }])
  })
})

const setsOf = async ({ administrator }: ReadyDistrict): Promise<CriteriaSetView[]> =>
  (await administrator.api.get('/criteria-sets').expect(200)).body

const madeSet = async (name: string, effectiveFrom?: string): Promise<CriteriaSetView> => {
  const input = { ...publishedCriteriaInput(effectiveFrom), name }
  return (await district.administrator.api.post('/criteria-sets', input).expect(201)).body
}

describe('criteria sets', () => {
  it('come in force one at a time, and the one before is retired', async () => {
    const [before] = (await setsOf(district)).filter(({ status }) => status === 'in-force')
    const made = await madeSet('State standard')
    expect(made.status).toBe('draft')
    const { api } = district.administrator
    const { body } = await api.act(`/criteria-sets/${made.id}/put-in-force`).expect(200)
    expect(body).toMatchObject({ id: made.id, status: 'in-force' })
    const status = new Map((await setsOf(district)).map((set) => [set.id, set.status]))
    expect(status.get(before?.id ?? '')).toBe('retired')
    expect([...status.values()].filter((one) => one === 'in-force')).toHaveLength(1)
    expect((await setsOf(other)).map((set) => set.status)).toEqual(['in-force'])
  })

  it('that were in force or are cannot come in force again', async () => {
    for (const { id, status } of (await setsOf(district)).filter((set) => set.status !== 'draft')) {
      const again = await district.administrator.api.act(`/criteria-sets/${id}/put-in-force`).expect(409)
      expect([status, again.body.type]).toEqual([status, 'urn:wadestone:problem:already-in-use'])
    }
  })

  it('answer a repeated press as the first time', async () => {
    const { id } = await madeSet('Pressed twice')
    const [path, key] = [`/criteria-sets/${id}/put-in-force`, randomUUID()]
    const { api } = district.administrator
    const first = await api.act(path, {}, key).expect(200)
    expect((await api.act(path, {}, key).expect(200)).body).toEqual(first.body)
  })

  it('put in force at the same moment leave one in force, and no error', async () => {
    const made = await Promise.all([madeSet('A'), madeSet('B'), madeSet('C')])
    const { api } = district.administrator
    const answers = await Promise.all(made.map(({ id }) => api.act(`/criteria-sets/${id}/put-in-force`)))
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200])
    const inForce = (await setsOf(district)).filter(({ status }) => status === 'in-force')
    expect(inForce).toHaveLength(1)
    expect(made.map(({ id }) => id)).toContain(inForce[0]?.id)
  })

  it('wait for their first day', async () => {
    const { id } = await madeSet('Next century', '2126-01-01')
    const { body } = await district.administrator.api.act(`/criteria-sets/${id}/put-in-force`).expect(422)
    expect(body.detail).toContain('1 January 2126')
  })

  it('of another district are not there', async () => {
    const { id } = await madeSet('Own')
    await other.administrator.api.act(`/criteria-sets/${id}/put-in-force`).expect(404)
  })
})

describe('cost lists', () => {
  const { costList } = readExample('north-pond').job

  it('come in force one at a time, by the office', async () => {
    const { api } = district.office
    const made: CostListView = (await api.post('/cost-lists', { ...costList, name: 'Autumn' }).expect(201))
      .body
    await api.act(`/cost-lists/${made.id}/put-in-force`).expect(200)
    const lists: CostListView[] = (await api.get('/cost-lists').expect(200)).body
    expect(lists.map(({ name, status }) => [name, status])).toEqual([
      ['Autumn', 'in-force'],
      [costList.name, 'retired'],
    ])
    expect(lists[0]?.lines).toEqual(costList.lines)
    await api.act(`/cost-lists/${made.id}/put-in-force`).expect(409)
  })

  it('with lines that cannot be are refused beside the line', async () => {
    const lines = [
      { key: 'gravel', low: '1', typical: '2', high: '3' },
      { key: 'gate', low: '300', typical: '200.00', high: '400' },
    ]
    const { body } = await district.office.api.post('/cost-lists', { ...costList, lines }).expect(422)
    expect(body.fields.map(({ pointer }: { pointer: string }) => pointer)).toEqual([
      '/lines/0/key',
      '/lines/1/typical',
    ])
  })

  it('are read by the planner and not written', async () => {
    await district.planner.api.get('/cost-lists').expect(200)
    await district.planner.api.post('/cost-lists', costList).expect(403)
  })
})
