import { expectProblem } from './support/expect-problem'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let walked: Walked

const email = 'reader@farms.example'
const minutes = (count: number): number => count * 60_000
const days = (count: number): number => count * 24 * minutes(60)

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft(email)
  await walk.withLandowner(walked)
})
/** Codes are counted by the hour. */
afterEach(() => app.clock.moveOn(minutes(61)))
afterAll(() => app.stop())

async function newest(pattern: RegExp): Promise<string> {
  await app.drain()
  const texts = app.mail.to(email).map(({ text }) => pattern.exec(text ?? '')?.[1])
  return texts.findLast((found) => found !== undefined) ?? 'none'
}

const newestToken = () => newest(/#t=([\w-]{43})/)
const open = (token: string) => app.client().post('/entry/open', { token })
const enter = (token: string, code: string) => app.client().post('/entry/code', { token, code })

async function newCode(token: string): Promise<string> {
  await open(token).expect(202)
  return newest(/\b(\d{6})\b/)
}

const otherThan = (code: string): string => String((Number(code) + 1) % 1_000_000).padStart(6, '0')

describe('a mailed link', () => {
  it('opens nothing by itself: a code goes to the same box, and the answer hints at the address alone', async () => {
    const token = await newestToken()
    const answer = await open(token).expect(202)
    expect(answer.body).toEqual({ emailHint: 'r…@farms.example' })
    expect(answer.headers['set-cookie']).toBeUndefined()
  })

  it('lets in with the code to its own job, as landowner and nothing else', async () => {
    const token = await newestToken()
    const landowner = app.client()
    await landowner.post('/entry/code', { token, code: await newCode(token) }).expect(201)
    const { body } = await landowner.get('/session').expect(200)
    expect(body).toMatchObject({ jobId: walked.job.id, roles: ['landowner'], memberships: [] })
    await landowner.get(`/jobs/${walked.job.id}`).expect(200)
    expectProblem(await landowner.get('/jobs'), 'forbidden')
    expectProblem(await landowner.put('/session/district', { districtId: district.districtId }), 'not-found')
  })

  it('that was never made is answered as one that ran out', async () => {
    const made = await newestToken()
    const never = `${made.slice(0, -4)}AAAA`
    const unknown = JSON.parse((await open(never)).text)
    expectProblem(await open(never), 'link-spent')
    expectProblem(await enter(never, '000000'), 'link-spent')
    app.clock.moveOn(days(14))
    const over = JSON.parse((await open(made)).text)
    app.clock.moveOn(-days(14))
    expect({ ...over, requestId: null }).toEqual({ ...unknown, requestId: null })
  })

  it('is no good once a newer one was sent', async () => {
    const old = await newestToken()
    const code = await newCode(old)
    const landowner = await walk.comeByMail(walked)
    await walk.act(landowner, walked, { action: 'ask-for-changes', note: 'Move the gate.' }).expect(200)
    await walk.settleNotes(walked)
    await walk.act(district.planner.api, walked, { action: 'send-to-landowner' }).expect(200)
    expect(await newestToken()).not.toBe(old)
    expectProblem(await open(old), 'link-spent')
    expectProblem(await enter(old, code), 'link-spent')
  })

  it('mails at most six codes within the hour', async () => {
    const token = await newestToken()
    for (let count = 1; count <= 6; count++) await open(token).expect(202)
    const refused = await open(token)
    expectProblem(refused, 'too-many-tries')
    expect(refused.headers['retry-after']).toBe('3600')
  })
})

describe('a mailed code', () => {
  it('lets in once', async () => {
    const token = await newestToken()
    const code = await newCode(token)
    await enter(token, code).expect(201)
    expectProblem(await enter(token, code), 'wrong-code')
  })

  it('lets one of two in who type it at the same moment', async () => {
    const token = await newestToken()
    const code = await newCode(token)
    const answers = await Promise.all([enter(token, code), enter(token, code), enter(token, code)])
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 401, 401])
  })

  it('is no good after ten minutes, nor once a newer one was mailed', async () => {
    const token = await newestToken()
    const first = await newCode(token)
    app.clock.moveOn(minutes(10))
    expectProblem(await enter(token, first), 'wrong-code')
    const second = await newCode(token)
    const third = await newCode(token)
    if (second !== third) expectProblem(await enter(token, second), 'wrong-code')
    await enter(token, third).expect(201)
  })

  it('is dead after five wrong tries, even for who types it right', async () => {
    const token = await newestToken()
    const code = await newCode(token)
    for (let failure = 1; failure <= 5; failure++) {
      expectProblem(await enter(token, otherThan(code)), 'wrong-code')
    }
    expectProblem(await enter(token, code), 'wrong-code')
    await enter(token, await newCode(token)).expect(201)
  })

  it('is no good for another link', async () => {
    const token = await newestToken()
    const code = await newCode(token)
    const neighbour = await walk.draft('neighbour@farms.example')
    await walk.withLandowner(neighbour)
    const theirs = app.mail
      .to('neighbour@farms.example')
      .map(({ text }) => /#t=([\w-]{43})/.exec(text ?? '')?.[1])
      .find((found) => found !== undefined)
    expectProblem(await enter(theirs ?? '', code), 'wrong-code')
    await enter(token, code).expect(201)
  })
})
