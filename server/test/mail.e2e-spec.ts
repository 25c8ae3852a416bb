import type { MailView } from 'shared'
import { expectProblem } from './support/expect-problem'
import { refusal } from './support/mail-catcher'
import { drainAgain, waitingTasks } from './support/queue-time'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { districtTables } from './support/rows-of-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
/** Made and checked once; each test sends it and asks for a change, which posts the planner a letter. */
let walked: Walked

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft('first@farms.example')
  const packet = await walk.packet(walked)
  await district.checker.api.act(`/packets/${packet.id}/technical-check`).expect(200)
})
afterEach(() => {
  app.mail.refusals = []
  app.mail.refused.length = 0
  app.mail.mails.length = 0
})
afterAll(() => app.stop())

/** The link to the landowner is put in the post. */
const send = () => walk.act(district.planner.api, walked, { action: 'send-to-landowner' }).expect(200)

const comesBack = async () => {
  app.mail.refusals = []
  await drainAgain(app)
  const landowner = await walk.comeByMail(walked)
  await walk.act(landowner, walked, { action: 'ask-for-changes', note: 'Once more.' }).expect(200)
  await walk.settleNotes(walked)
  await app.drain()
}

const newestLink = async (): Promise<MailView> => {
  const { body } = await district.office.api.get(`/jobs/${walked.job.id}/mail`).expect(200)
  const links: MailView[] = body.filter(({ kind }: MailView) => kind === 'entry-link')
  return links.at(-1)!
}

describe('a message', () => {
  it('that is not taken now is tried again under the same Message-ID until it is', async () => {
    await send()
    app.mail.refusals = [450, 421]
    await app.drain()
    const waiting = await newestLink()
    expect(waiting).toMatchObject({ status: 'waiting', attempts: 1, sentAt: null, to: 'first@farms.example' })
    expect(waiting.lastError).toBe(`450 ${refusal}`)
    await drainAgain(app)
    expect(await newestLink()).toMatchObject({ status: 'waiting', attempts: 2 })
    await drainAgain(app)
    const sent = await newestLink()
    expect(sent).toMatchObject({ status: 'sent', attempts: 3, lastError: null, messageId: waiting.messageId })
    const tries = [...app.mail.refused, ...app.mail.mails].map(({ messageId }) => messageId)
    expect(tries).toEqual([sent.messageId, sent.messageId, sent.messageId])
    await comesBack()
  })

  it('that is refused for good is failed with what the mail server said, and tried no more', async () => {
    await send()
    app.mail.refusals = [550]
    await app.drain()
    const failed = await newestLink()
    expect(failed).toMatchObject({ status: 'failed', attempts: 1, sentAt: null, lastError: `550 ${refusal}` })
    expect(await waitingTasks(app)).toBe(0)
    await drainAgain(app)
    expect(app.mail.mails).toEqual([])
    const events = (await district.planner.api.get(`/jobs/${walked.job.id}/events`)).body
    expect(events.at(-1)).toMatchObject({
      kind: 'mail-failed',
      sentence: 'The link to the packet could not be delivered.',
    })
  })
})

describe('a message nobody ever takes', () => {
  it('is failed after the twelfth try', async () => {
    const next = await walk.draft('second@farms.example')
    const packet = await walk.packet(next)
    await district.checker.api.act(`/packets/${packet.id}/technical-check`).expect(200)
    await walk.act(district.planner.api, next, { action: 'send-to-landowner' }).expect(200)
    app.mail.refusals = Array.from({ length: 20 }, () => 451)
    for (let attempt = 1; attempt <= 14; attempt++) await drainAgain(app)
    const { body } = await district.office.api.get(`/jobs/${next.job.id}/mail`).expect(200)
    expect(body).toEqual([
      expect.objectContaining({ status: 'failed', attempts: 12, lastError: `451 ${refusal}` }),
    ])
    expect(await waitingTasks(app)).toBe(0)
  })
})

describe('the mail log of a job', () => {
  it('is read by planner and office, shows no text, and is closed to others', async () => {
    const path = `/jobs/${walked.job.id}/mail`
    const { text } = await district.planner.api.get(path).expect(200)
    expect(text).not.toMatch(/#t=|\b\d{6}\b|Dear/)
    expectProblem(await district.supervisor.api.get(path), 'forbidden')
    expectProblem(await app.client().get(path), 'not-signed-in')
  })
})

describe('a link or code in a message', () => {
  it('is wiped from the database once the message is sent, and kept nowhere else', async () => {
    const next = await walk.draft('third@farms.example')
    await walk.withLandowner(next)
    const letters = app.mail.to('third@farms.example').map(({ text }) => text ?? '')
    const token = letters.map((text) => /#t=([\w-]{43})/.exec(text)?.[1]).find((found) => found) ?? ''
    const code = letters.map((text) => /\b(\d{6})\b/.exec(text)?.[1]).findLast((found) => found) ?? ''
    expect([token.length, code.length]).toEqual([43, 6])
    const { owner } = app.database
    const secrets = await owner.query(
      `select kind, status, text from mail_messages where job_id = $1 order by kind`,
      [next.job.id],
    )
    expect(secrets).toEqual([
      { kind: 'entry-code', status: 'sent', text: null },
      { kind: 'entry-link', status: 'sent', text: null },
    ])
    for (const table of [...districtTables(owner), 'people', 'graphile_worker._private_jobs']) {
      const found = await owner.query(`select 1 from ${table} t where position($1 in t::text) > 0`, [token])
      expect([table, found]).toEqual([table, []])
    }
    const codes = await owner.query(`select code_hash from entry_codes where code_hash like $1`, [
      `%${code}%`,
    ])
    expect(codes).toEqual([])
  })

  it('stands in no event and in no answer of the server', async () => {
    const next = await walk.draft('fourth@farms.example')
    const { landowner } = await walk.withLandowner(next)
    const letters = app.mail.to('fourth@farms.example').map(({ text }) => text ?? '')
    const token = letters.map((text) => /#t=([\w-]{43})/.exec(text)?.[1]).find((found) => found) ?? 'none'
    const answers = [
      await district.planner.api.get(`/jobs/${next.job.id}/events`),
      await district.planner.api.get(`/jobs/${next.job.id}/mail`),
      await landowner.get('/session'),
      await landowner.get(`/jobs/${next.job.id}`),
    ]
    for (const { text } of answers) expect(text).not.toContain(token)
  })
})

describe('the text of other letters', () => {
  it('is kept, with the district that wrote it', async () => {
    const next = await walk.draft('fifth@farms.example')
    const { landowner } = await walk.withLandowner(next)
    await walk.act(landowner, next, { action: 'ask-for-changes', note: 'Move the gate.' }).expect(200)
    await app.drain()
    const [letter] = await app.database.owner.query(
      `select text from mail_messages where job_id = $1 and kind = 'returned'`,
      [next.job.id],
    )
    expect(letter.text).toContain('Move the gate.')
    expect(letter.text).toContain('Sable Basin District (example)')
    expect(app.mail.to(district.planner.email).at(-1)?.text).toContain('Move the gate.')
  })
})
