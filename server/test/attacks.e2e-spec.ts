import { randomUUID } from 'node:crypto'
import type { EventView, PacketView, ProducerView } from 'shared'
import { Signature } from '../src/signatures/signature.entity'
import { expectProblem } from './support/expect-problem'
import { openSession } from './support/open-session'
import { makeReadyDistrict, testPassword, type ReadyDistrict } from './support/ready-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { signature, Walk } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let other: ReadyDistrict
let walk: Walk

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  other = await makeReadyDistrict(app, 'Corrow Fork District (example)')
  walk = new Walk(app, district)
})
afterEach(() => app.clock.moveOn(3_700_000))
afterAll(() => app.stop())

const newEmail = () => `${randomUUID().slice(0, 8)}@farms.example`

async function moveSigner(producer: ProducerView, email: string) {
  const { api } = district.planner
  const { headers } = await api.get(`/producers/${producer.id}`).expect(200)
  const version = Number(/v(\d+)/.exec(headers['etag'] ?? '')?.[1])
  const { name, farmName, address } = producer
  return api.put(`/producers/${producer.id}`, { name, farmName, address, email }, { version })
}

describe('an administrator', () => {
  it('gets no password for a person who is known in another district', async () => {
    const walked = await walk.draft(newEmail())
    const person = { name: 'Anyone', email: walked.producer.email, roles: ['office'], approvalLimits: null }
    const { body } = await other.administrator.api.post('/people', person).expect(201)
    expect(body.temporaryPassword).toBeNull()
  })
})

describe('a designer or checker', () => {
  it('cannot sign by taking the place of the producer', async () => {
    const walked = await walk.draft(newEmail())
    const { packet } = await walk.withLandowner(walked)
    expect((await moveSigner(walked.producer, district.planner.email)).status).toBe(200)
    const planner = await openSession(app, {
      personId: district.planner.personId,
      districtId: district.districtId,
    })
    await planner.api.post(`/packets/${packet.id}/consent`, { consentVersion: '2026-1', agrees: true })
    for (const { number } of packet.pages) {
      await planner.api.post(`/packets/${packet.id}/read-pages`, { page: number })
    }
    const answer = await walk.act(planner.api, walked, signature(packet))
    expectProblem(answer, 'transition-not-allowed')
    expect(answer.body.detail).toContain('designed or checked')
    const events: EventView[] = (await planner.api.get(`/jobs/${walked.job.id}/events`)).body
    expect(events.map(({ kind }) => kind)).toContain('producer-changed')
  })

  it('cannot put another person in the place of one who signed', async () => {
    const walked = await walk.draft(newEmail())
    await walk.withSupervisor(walked)
    const answer = await moveSigner(walked.producer, newEmail())
    expectProblem(answer, 'invalid-fields')
    expect(answer.body.fields[0]).toMatchObject({ pointer: '/email' })
  })
})

describe('a signature', () => {
  const methodOf = async (packet: PacketView) =>
    app.inDistrict(district.districtId, async ({ manager, districtId }) => {
      const found = await manager.findOneByOrFail(Signature, { districtId, packetId: packet.id })
      return found.method
    })

  it('carries how the signer came in: by the mailed link', async () => {
    const walked = await walk.draft(newEmail())
    expect(await methodOf(await walk.withSupervisor(walked))).toBe('mailed-link-and-code')
  })

  it('carries how the signer came in: by a password', async () => {
    const walked = await walk.draft(newEmail())
    const { packet } = await walk.withLandowner(walked)
    const { districtId } = district
    const { personId } = walked.producer
    const { api } = await openSession(app, { personId: personId ?? '', districtId })
    await walk.sign(walked, { packet, landowner: api })
    expect(await methodOf(packet)).toBe('password')
  })

  it('is asked of each signer apart: two producers of a job cannot share an address', async () => {
    const email = newEmail()
    const { api } = district.planner
    const producer = async (name: string): Promise<ProducerView> =>
      (await api.post('/producers', { name, farmName: `${name} farm`, email }).expect(201)).body
    const [one, two] = [await producer('Ada Fen'), await producer('Bo Fen')]
    const { job } = await walk.draft(newEmail())
    const body = {
      title: 'Shared',
      body: 'pond',
      waterName: job.waterName,
      county: job.county,
      producerIds: [one.id, two.id],
    }
    const answer = await api.post('/jobs', body)
    expectProblem(answer, 'invalid-fields')
    expect(answer.body.fields[0].pointer).toBe('/producerIds/1')
  })
})

describe('many tries at once', () => {
  it('get no more mailed codes than tries one after the other', async () => {
    const email = newEmail()
    const walked = await walk.draft(email)
    await walk.withLandowner(walked)
    app.clock.moveOn(3_700_000)
    const token = app.mail
      .to(email)
      .map(({ text }) => /#t=([\w-]{43})/.exec(text ?? '')?.[1])
      .findLast((found) => found !== undefined)
    const answers = await Promise.all(
      Array.from({ length: 20 }, () => app.client().post('/entry/open', { token })),
    )
    expect(answers.filter(({ status }) => status === 202)).toHaveLength(6)
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(14)
  })

  it('get no more guesses at a password than tries one after the other', async () => {
    const { email } = district.office
    const guess = () => app.client().post('/session', { email, password: 'not the right one at all' })
    const answers = await Promise.all(Array.from({ length: 20 }, guess))
    const taken = answers.filter(({ status }) => status === 401).length
    expect(answers.filter(({ status }) => status === 429)).toHaveLength(20 - taken)
    // Five are free; on a slow machine the first short waits run out while the others still come in.
    expect(taken).toBeGreaterThanOrEqual(5)
    expect(taken).toBeLessThanOrEqual(8)
    app.clock.moveOn(3_700_000)
    await app.client().post('/session', { email, password: testPassword }).expect(201)
  })
})

describe('a mailed link', () => {
  it('shows and ends no other session of the same person', async () => {
    const walked = await walk.draft(newEmail())
    const { landowner } = await walk.withLandowner(walked)
    const { districtId } = district
    const password = await openSession(app, { personId: walked.producer.personId ?? '', districtId })
    expect((await landowner.get('/sessions').expect(200)).body).toHaveLength(1)
    expectProblem(await landowner.delete(`/sessions/${password.sessionId}`), 'not-found')
    await password.api.get('/session').expect(200)
  })
})

describe('a body', () => {
  it('that is nested beyond any document is refused before anybody walks it', async () => {
    const { job } = await walk.draft(newEmail())
    const deep = JSON.parse(`${'['.repeat(5000)}${']'.repeat(5000)}`) as object
    expectProblem(await district.planner.api.act(`/jobs/${job.id}/acts`, { deep }), 'malformed-request')
  })
})
