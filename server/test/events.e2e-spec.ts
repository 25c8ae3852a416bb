import type { EventView, JobView } from 'shared'
import { EventLog, type ChainVerdict } from '../src/platform/events/event-log.service'
import { readExample } from './support/example'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { asOwnerIn } from './support/rows-of-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let walked: Walked
let done: JobView

const email = 'odile@farms.example'
const notes = ['The cows crowd at the pad.', 'Carry the berm farther.', 'Is the gate wide enough?', 'Done.']

/** A whole job with every kind of act on the way: sent, asked back, signed, returned, signed again, approved, sent. */
beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft(email)
  const { planner, supervisor, office } = district
  await planner.api.post(`/jobs/${walked.job.id}/notes`, { text: notes[2] }).expect(201)
  await walk.settleNotes(walked)
  const first = await walk.withLandowner(walked)
  await walk.act(first.landowner, walked, { action: 'ask-for-changes', note: notes[0] }).expect(200)
  await walk.settleNotes(walked)
  const second = await walk.withLandowner(walked)
  await walk.sign(walked, second)
  await walk.act(supervisor.api, walked, { action: 'return', notes: [notes[1]] }).expect(200)
  await walk.settleNotes(walked)
  await walk.approved(walked)
  await walk.act(office.api, walked, { action: 'send', addressConfirmed: true }).expect(200)
  await app.drain()
  done = await walk.read(walked.job.id)
})
afterAll(() => app.stop())

const verify = (streamId: string): Promise<ChainVerdict> =>
  app.inDistrict(district.districtId, (tx) => app.nest.get(EventLog).verify(tx, streamId))

interface StoredEvent {
  sequence: number
  kind: string
  actor_id: string | null
  facts: Record<string, unknown>
  row_hash: string
}

const stored = (): Promise<StoredEvent[]> =>
  app.inDistrict(district.districtId, ({ manager }) =>
    manager.query('select * from events where stream_id = $1 order by sequence', [done.id]),
  )

/** As nobody can by the server: with the trigger that guards the table off. */
const tamper = (statement: string, ...given: unknown[]): Promise<unknown> =>
  asOwnerIn(app.database.owner, district.districtId, async (manager) => {
    await manager.query('alter table events disable trigger user')
    await manager.query(statement, [done.id, ...given])
    await manager.query('alter table events enable trigger user')
  })

describe('the record of a whole job', () => {
  it('tells every act in the order it happened, by whom, in sentences', async () => {
    expect(done.state).toBe('sent')
    const { body } = await district.planner.api.get(`/jobs/${done.id}/events`).expect(200)
    const events: EventView[] = body
    const acts = ['send-to-landowner', 'ask-for-changes', 'sign', 'return', 'approve', 'send']
    expect(events.map(({ kind }) => kind).filter((kind) => acts.includes(kind))).toEqual([
      'send-to-landowner',
      'ask-for-changes',
      'send-to-landowner',
      'sign',
      'return',
      'send-to-landowner',
      'sign',
      'approve',
      'send',
    ])
    expect(events.map(({ sequence }) => sequence)).toEqual(events.map((_, index) => index + 1))
    expect(events.find(({ kind }) => kind === 'approve')?.sentence).toBe('Tomas Quill approved revision 3.')
    expect(events.find(({ kind }) => kind === 'return')?.sentence).toBe(
      'Tomas Quill returned revision 2 with 1 note.',
    )
    for (const { sentence } of events) expect(sentence).toMatch(/^[A-Z].*\.$/)
  })

  it('is an unbroken chain', async () => {
    const newest = (await stored()).at(-1)
    expect(await verify(done.id)).toEqual({
      isIntact: true,
      head: { sequence: newest?.sequence, rowHash: newest?.row_hash },
    })
    expect(await verify(district.districtId)).toEqual({ isIntact: true, head: expect.anything() })
  })

  it('holds no name, no address and no word of a person, only ids, hashes, numbers and keys', async () => {
    const { job } = readExample('north-pond')
    const { planner, checker, supervisor, office } = district
    const words = [
      ...[planner, checker, supervisor, office].flatMap((member) => [member.name, member.email]),
      ...[email, job.producer.name, job.producer.farmName, job.job.title, job.job.county, 'First design'],
      ...notes,
    ]
    const all = JSON.stringify(await stored())
    for (const word of words) expect(all).not.toContain(word)
    const texts = (await stored())
      .flatMap(({ facts }) => Object.values(facts).flat())
      .filter((fact) => typeof fact === 'string')
    expect(texts.filter((text) => !/^[\w-]{1,64}$/.test(text))).toEqual([])
    expect(texts.length).toBeGreaterThan(50)
  })

  it('shows a landowner the acts and nothing of the work of the district', async () => {
    const landowner = await walk.comeByMail(walked)
    const { body } = await landowner.get(`/jobs/${done.id}/events`).expect(200)
    const kinds = new Set(body.map(({ kind }: EventView) => kind))
    expect([...kinds]).toEqual(expect.arrayContaining(['sign', 'approve', 'send']))
    for (const kind of ['note-written', 'technically-checked', 'survey-saved', 'mail-sent']) {
      expect(kinds.has(kind)).toBe(false)
    }
  })
})

describe('a record that somebody changed behind the server', () => {
  const signedAt = async (): Promise<number> =>
    (await stored()).find(({ kind }) => kind === 'sign')?.sequence ?? Number.NaN
  const row = 'where stream_id = $1 and sequence = $2'

  it.each([
    ['a fact', `facts = facts || '{"revision": 9}'`],
    ['who did it', 'actor_id = gen_random_uuid()'],
    ['when', `at = at + interval '1 millisecond'`],
    ['what was done', `kind = 'approve'`],
    ['the hash before it', `previous_hash = repeat('1', 64)`],
    ['its own hash', `row_hash = repeat('1', 64)`],
  ])('breaks at the very row: %s', async (_name, change) => {
    const sequence = await signedAt()
    const [was] = await app.database.owner.query(`select * from events ${row}`, [done.id, sequence])
    await tamper(`update events set ${change} ${row}`, sequence)
    expect(await verify(done.id)).toEqual({ isIntact: false, brokenAt: sequence })
    await tamper(
      `update events set facts = $3, actor_id = $4, at = $5, kind = $6, previous_hash = $7, row_hash = $8 ${row}`,
      ...[sequence, was.facts, was.actor_id, was.at, was.kind, was.previous_hash, was.row_hash],
    )
    expect(await verify(done.id)).toMatchObject({ isIntact: true })
  })

  it('breaks where a row is missing, even when those after it are counted anew', async () => {
    const sequence = await signedAt()
    await tamper(`delete from events ${row}`, sequence)
    expect(await verify(done.id)).toEqual({ isIntact: false, brokenAt: sequence })
    await tamper('update events set sequence = -sequence where stream_id = $1 and sequence > $2', sequence)
    await tamper('update events set sequence = -sequence - 1 where stream_id = $1 and sequence < 0')
    expect(await verify(done.id)).toEqual({ isIntact: false, brokenAt: sequence })
  })
})
