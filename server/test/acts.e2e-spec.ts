import { randomUUID } from 'node:crypto'
import type { JobView, Money, PacketView } from 'shared'
import { addMember, giveRoles } from './support/add-member'
import type { ApiClient } from './support/api-client'
import { readExample } from './support/example'
import { expectProblem, pointersOf } from './support/expect-problem'
import { makeReadyDistrict, type Member, type ReadyDistrict } from './support/ready-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { signature, Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
/** A checker whose limits a small pond alone would keep. */
let narrow: Member
let secondSupervisor: Member

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  const { districtId, planner } = district
  const limits = {
    maximumHead: 74,
    maximumDrainageAcres: 5,
    maximumFillHeightFt: 6,
    maximumCost: '20000.00' as Money,
  }
  narrow = await addMember(app, districtId, { name: 'Edda Rowe', roles: ['planner'], limits })
  secondSupervisor = await addMember(app, districtId, { name: 'Jon Abelard', roles: ['supervisor'] })
  // The hardest case: a designer who may approve, but for having designed.
  await giveRoles(app, districtId, { ...planner, roles: ['planner', 'supervisor'] })
})
afterAll(() => app.stop())

const reasonsOf = async (answer: ReturnType<ApiClient['act']>): Promise<readonly string[]> =>
  expectProblem(await answer, 'transition-not-allowed').reasons ?? []

const eventKinds = async ({ job }: Walked): Promise<string[]> =>
  (await district.planner.api.get(`/jobs/${job.id}/events`)).body.map(({ kind }: { kind: string }) => kind)

const offered = (job: JobView) => job.actions.filter(({ enabled }) => enabled).map(({ action }) => action)

const send = { action: 'send-to-landowner' }
const words = {
  noPacket: 'The packet of this very design is not made yet. Make the packet first.',
  notChecked: 'The technical check of this packet is not done yet.',
  beyondLimits: 'The design is beyond the approval limits of the person who checked it.',
  ownDesign: 'You made this design. Another person must decide.',
  openNote: '1 note is still open. Answer and settle each.',
  noConsent: 'You have not agreed to electronic records yet.',
  notRead: 'You have not opened every page yet.',
  otherPacket: 'This is not the packet that is in force now. Open the newest revision and read it again.',
}

describe('a draft', () => {
  let walked: Walked
  let packet: PacketView
  const check = (by: ApiClient) => by.act(`/packets/${packet.id}/technical-check`)
  const sendIt = () => walk.act(district.planner.api, walked, send)
  beforeAll(async () => {
    walked = await walk.draft('draft@farms.example')
  })

  it('is not sent before there is a packet, and says so before the button is pressed', async () => {
    expect(await reasonsOf(sendIt())).toEqual([words.noPacket, words.notChecked])
    const { actions } = await walk.read(walked.job.id)
    expect(actions.find(({ action }) => action === 'send-to-landowner')).toMatchObject({
      enabled: false,
      reasons: [words.noPacket, words.notChecked],
    })
  })

  it('is not sent before somebody checked its figures', async () => {
    packet = await walk.packet(walked)
    expect(await reasonsOf(sendIt())).toEqual([words.notChecked])
  })

  it('is not checked by its designer, nor by a role without that permission', async () => {
    expect(await reasonsOf(check(district.planner.api))).toEqual([words.ownDesign])
    expectProblem(await check(district.office.api), 'forbidden')
    expectProblem(await check(district.administrator.api), 'forbidden')
  })

  it('is not sent when it is beyond the limits of its checker, or when a checker has none', async () => {
    for (const { api } of [narrow, secondSupervisor]) {
      const { body } = await check(api).expect(200)
      expect(body.technicalCheck.withinLimits).toBe(false)
      expect(await reasonsOf(sendIt())).toEqual([words.beyondLimits])
    }
  })

  it('is not sent with an open note', async () => {
    await check(district.checker.api).expect(200)
    await district.checker.api.post(`/jobs/${walked.job.id}/notes`, { text: 'Wider gate?' }).expect(201)
    expect(await reasonsOf(sendIt())).toEqual([words.openNote])
    await walk.settleNotes(walked)
  })

  it('is sent by a planner alone', async () => {
    for (const { api } of [district.supervisor, district.office]) {
      const { reasons } = expectProblem(await walk.act(api, walked, send), 'forbidden')
      expect(reasons).toEqual(['Only a planner may do this: Send to landowner.'])
    }
  })

  it('cannot be signed, approved, returned or sent out', async () => {
    const { planner, supervisor, office } = district
    const acts: [ApiClient, object][] = [
      [supervisor.api, { action: 'approve', packetSha256: packet.sha256 }],
      [supervisor.api, { action: 'return', notes: ['Not yet.'] }],
      [office.api, { action: 'send', addressConfirmed: true }],
      [planner.api, signature(packet)],
    ]
    for (const [api, act] of acts) {
      const [reason] = await reasonsOf(walk.act(api, walked, act))
      expect(reason).toMatch(/^A job that is draft cannot do this: /)
    }
  })

  it('that was refused so often stands where it stood, with no event of an act and no mail', async () => {
    const job = await walk.read(walked.job.id)
    expect([job.state, job.packetId]).toEqual(['draft', packet.id])
    expect(await eventKinds(walked)).not.toContain('send-to-landowner')
    await app.drain()
    expect(app.mail.to('draft@farms.example')).toEqual([])
  })
})

describe('a job with its landowner', () => {
  let walked: Walked
  let packet: PacketView
  let landowner: ApiClient
  async function changeDesign(plan: object): Promise<void> {
    const { api } = district.planner
    const { id, name, version } = (await api.get(`/designs/${walked.designId}`)).body
    await api.put(`/designs/${id}`, { name, plan }, { version }).expect(200)
  }
  const sign = (change: object = {}) => walk.act(landowner, walked, { ...signature(packet), ...change })
  beforeAll(async () => {
    walked = await walk.draft('signer@farms.example')
    ;({ packet, landowner } = await walk.withLandowner(walked))
  })

  it('is not signed without consent and without every page opened', async () => {
    expect(await reasonsOf(sign())).toEqual([words.noConsent, words.notRead])
    await landowner
      .post(`/packets/${packet.id}/consent`, { consentVersion: '2026-1', agrees: true })
      .expect(200)
    for (const { number } of packet.pages.slice(1)) {
      await landowner.post(`/packets/${packet.id}/read-pages`, { page: number }).expect(200)
    }
    expect(await reasonsOf(sign())).toEqual([words.notRead])
    const beyond = await landowner.post(`/packets/${packet.id}/read-pages`, { page: packet.pages.length + 1 })
    expect(pointersOf(expectProblem(beyond, 'invalid-fields'))).toEqual(['/page'])
    await landowner.post(`/packets/${packet.id}/read-pages`, { page: 1 }).expect(200)
  })

  it('is not signed for other bytes than those of its packet', async () => {
    expect(await reasonsOf(sign({ packetSha256: '0'.repeat(64) }))).toEqual([words.otherPacket])
  })

  it('is not signed without a name or without meaning it', async () => {
    for (const [change, pointer] of [
      [{ typedName: '  ' }, '/typedName'],
      [{ typedName: 'Somebody Else' }, '/typedName'],
      [{ intends: false }, '/intends'],
      [{ packetSha256: 'short' }, '/packetSha256'],
    ] as const) {
      expect(pointersOf(expectProblem(await sign(change), 'invalid-fields'))).toEqual([pointer])
    }
  })

  it('is not signed by staff, and is not there for the landowner of another job', async () => {
    const { planner, supervisor, office } = district
    for (const { api } of [planner, supervisor, office]) {
      expectProblem(await walk.act(api, walked, signature(packet)), 'forbidden')
      expectProblem(await api.post(`/packets/${packet.id}/read-pages`, { page: 1 }), 'forbidden')
    }
    const elsewhere = await walk.draft('neighbour@farms.example')
    const { landowner: neighbour } = await walk.withLandowner(elsewhere)
    expectProblem(await walk.act(neighbour, walked, signature(packet)), 'not-found')
    expectProblem(await neighbour.get(`/packets/${packet.id}/file`), 'not-found')
  })

  it('cannot be changed, checked anew or approved meanwhile', async () => {
    const { planner, checker, supervisor } = district
    const { job: example, survey } = readExample('north-pond')
    const plan = { name: 'Changed', plan: example.plan }
    const tries = [
      planner.api.put(`/designs/${walked.designId}`, plan, { version: 1 }),
      planner.api.put(`/jobs/${walked.job.id}/survey`, survey, { version: 1 }),
      planner.api.act(`/jobs/${walked.job.id}/packets`, { designId: walked.designId }),
      checker.api.act(`/packets/${packet.id}/technical-check`),
      walk.act(supervisor.api, walked, { action: 'approve', packetSha256: packet.sha256 }),
    ]
    for (const answer of tries)
      expect(await reasonsOf(answer)).toEqual([expect.stringContaining('with landowner')])
  })

  it('is signed once', async () => {
    expect((await sign().expect(200)).body.state).toBe('with-supervisor')
    const [reason] = await reasonsOf(sign())
    expect(reason).toContain('with supervisor')
    const { revisions } = await walk.read(walked.job.id)
    expect(revisions[0]?.signatures).toEqual([
      { name: 'Odile Marchbank', signedAt: expect.any(String), isVoid: false },
    ])
  })

  it('goes back when the landowner takes the signature back, and the void one stays visible', async () => {
    const takeBack = { action: 'take-signature-back', reason: 'The neighbour objects.' }
    const answer = await walk.act(landowner, walked, takeBack).expect(200)
    expect(answer.body.state).toBe('returned')
    const { revisions, openNotes } = await walk.read(walked.job.id)
    expect(revisions[0]?.signatures).toEqual([expect.objectContaining({ isVoid: true })])
    expect(openNotes).toBe(1)
    const { body } = await district.planner.api.get(`/packets/${packet.id}`)
    expect(body.signatures).toEqual([expect.objectContaining({ name: 'Odile Marchbank', isVoid: true })])
  })

  it('that came back needs a new packet once its design is changed', async () => {
    await walk.settleNotes(walked)
    const { api } = district.planner
    const { plan } = readExample('north-pond').job
    await changeDesign({ ...plan, ramp: { ...plan.ramp, widthFt: 16 } })
    expect((await walk.read(walked.job.id)).packetId).toBeNull()
    expect(await reasonsOf(walk.act(api, walked, send))).toEqual([
      words.noPacket,
      words.notChecked,
      '1 criteria check fails without a variance.',
    ])
    await changeDesign({ ...plan, berm: { ...plan.berm, pastLeftFt: 50 } })
    expect(await reasonsOf(walk.act(api, walked, send))).toEqual([words.noPacket, words.notChecked])
    const old = district.checker.api.act(`/packets/${packet.id}/technical-check`)
    expect((await reasonsOf(old))[0]).toContain('not the packet of the design as it stands')
    const next = await walk.packet(walked)
    expect(next.revision).toBe(2)
    expect(next.sha256).not.toBe(packet.sha256)
    expect((await walk.read(walked.job.id)).packetId).toBe(next.id)
  })

  it('is withdrawn with a reason, and then nothing more can be done', async () => {
    const withdraw = (reason: string) => walk.act(landowner, walked, { action: 'withdraw', reason })
    expect(pointersOf(expectProblem(await withdraw(' '), 'invalid-fields'))).toEqual(['/reason'])
    expect((await withdraw('We sold the cows.').expect(200)).body.state).toBe('withdrawn')
    const job = await walk.read(walked.job.id)
    expect(offered(job)).toEqual([])
    expect((await reasonsOf(walk.act(district.planner.api, walked, send)))[0]).toContain('withdrawn')
    expect((await reasonsOf(withdraw('Again.')))[0]).toContain('withdrawn')
  })
})

describe('an act', () => {
  it('needs a key of its own, and a known name', async () => {
    const walked = await walk.draft('keyless@farms.example')
    const path = `/jobs/${walked.job.id}/acts`
    const { api } = district.planner
    const act = { action: 'withdraw', reason: 'A test.' }
    for (const key of [undefined, 'short', 'a key with blanks', 'x'.repeat(101)]) {
      const answer = await api.post(path, act, key === undefined ? {} : { key })
      expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toEqual(['/headers/idempotency-key'])
    }
    for (const other of [{ action: 'approve-it' }, {}, { ...act, state: 'approved' }]) {
      expectProblem(await api.act(path, other, randomUUID()), 'invalid-fields')
    }
    expect((await walk.read(walked.job.id)).state).toBe('draft')
  })
})
