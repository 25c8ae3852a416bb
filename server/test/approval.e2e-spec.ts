import { randomUUID } from 'node:crypto'
import type { PacketView } from 'shared'
import { addMember, giveRoles } from './support/add-member'
import type { ApiClient } from './support/api-client'
import { expectProblem, pointersOf } from './support/expect-problem'
import { openSession } from './support/open-session'
import { makeReadyDistrict, type Member, type ReadyDistrict } from './support/ready-district'
import { drawStandIns } from './support/stand-in-renderer'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let secondSupervisor: Member

const email = 'packet.reader@farms.example'

beforeAll(async () => {
  app = await startTestApp()
  drawStandIns(app)
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  const { districtId, planner, checker } = district
  secondSupervisor = await addMember(app, districtId, { name: 'Jon Abelard', roles: ['supervisor'] })
  for (const member of [planner, checker]) {
    await giveRoles(app, districtId, { ...member, roles: ['planner', 'supervisor'] })
  }
})
afterAll(() => app.stop())

const reasonsOf = async (answer: ReturnType<ApiClient['act']>): Promise<readonly string[]> =>
  expectProblem(await answer, 'transition-not-allowed').reasons ?? []

const packetMails = () => app.mail.to(email).filter(({ attachments }) => attachments.length > 0)

describe('a signed job', () => {
  let walked: Walked
  let packet: PacketView
  const approve = (by: ApiClient, packetSha256 = packet.sha256) =>
    walk.act(by, walked, { action: 'approve', packetSha256 })
  const sendOut = (key: string, change: object = {}) =>
    walk.act(district.office.api, walked, { action: 'send', addressConfirmed: true, ...change }, key)
  beforeAll(async () => {
    walked = await walk.draft(email)
    packet = await walk.withSupervisor(walked)
  })

  it('is not approved by its designer nor by its checker, who are supervisors too', async () => {
    const own = 'You made this design. Another person must decide.'
    expect(await reasonsOf(approve(district.planner.api))).toEqual([own])
    const checked = 'You made the technical check, and this district wants another person to approve.'
    expect(await reasonsOf(approve(district.checker.api))).toEqual([checked])
  })

  it('is not approved by another role, nor by a supervisor whom it pays', async () => {
    expectProblem(await approve(district.office.api), 'forbidden')
    const [{ person_id: payee }] = await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query('select person_id from producers where id = $1', [walked.producer.id]),
    )
    await giveRoles(app, district.districtId, { personId: payee, roles: ['landowner', 'supervisor'] })

    const { api } = await openSession(app, { personId: payee, districtId: district.districtId })
    const paid = 'You or your kin are paid by this job. Another person must decide.'
    expect(await reasonsOf(approve(api))).toEqual([paid])
    await giveRoles(app, district.districtId, { personId: payee, roles: ['landowner'] })
  })

  it('is not approved for other bytes than those that were signed', async () => {
    const [reason] = await reasonsOf(approve(district.supervisor.api, 'f'.repeat(64)))
    expect(reason).toContain('not the packet that is in force')
  })

  it('is not returned without a note', async () => {
    const { api } = district.supervisor
    for (const [notes, pointer] of [
      [[], '/notes'],
      [[' '], '/notes/0'],
    ] as const) {
      const answer = await walk.act(api, walked, { action: 'return', notes })
      expect(pointersOf(expectProblem(answer, 'invalid-fields'))).toEqual([pointer])
    }
    expect((await walk.read(walked.job.id)).state).toBe('with-supervisor')
  })

  it('is not sent out before it is approved', async () => {
    expect((await reasonsOf(sendOut(randomUUID())))[0]).toContain('with supervisor')
  })

  it('that two supervisors approve at the same moment is approved by exactly one', async () => {
    const by = [district.supervisor.api, secondSupervisor.api]
    const answers = await Promise.all(by.map((api) => approve(api)))
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
    const refused = answers.find(({ status }) => status === 409)
    if (refused) expectProblem(refused, 'transition-not-allowed')
    const { body } = await district.planner.api.get(`/jobs/${walked.job.id}/events`)
    const kinds = body.map(({ kind }: { kind: string }) => kind)
    expect(kinds.filter((kind: string) => kind === 'approve')).toHaveLength(1)
    const approvals = await app.inDistrict(district.districtId, ({ manager }) =>
      manager.query('select supervisor_id from approvals where job_id = $1', [walked.job.id]),
    )
    expect(approvals).toHaveLength(1)
  })

  it('is not sent out before packet B is made, nor without a look at the address', async () => {
    const [reason] = await reasonsOf(sendOut(randomUUID()))
    expect(reason).toBe('The approved packet is still being made. Try again in a moment.')
    await app.drain()
    expect(await reasonsOf(sendOut(randomUUID(), { addressConfirmed: false }))).toEqual([
      'Confirm the address the packet goes to.',
    ])
  })

  it('is mailed once, however often and however fast the button is pressed', async () => {
    const key = randomUUID()
    const [first, ...others] = await Promise.all([sendOut(key), sendOut(key), sendOut(key)])
    expect(first.status).toBe(200)
    for (const answer of [...others, await sendOut(key)]) {
      expect([answer.status, answer.body]).toEqual([200, first.body])
    }
    await app.drain()
    expect(packetMails()).toHaveLength(1)
    expect((await walk.read(walked.job.id)).state).toBe('sent')
  })

  it('is not mailed again by a press of its own', async () => {
    expect((await reasonsOf(sendOut(randomUUID())))[0]).toContain('A job that is sent cannot do this')
    await app.drain()
    expect(packetMails()).toHaveLength(1)
  })

  it('keeps a key to the one thing it was used for, and to the one person', async () => {
    const key = randomUUID()
    const note = await walk.draft('other.thing@farms.example')
    const withdraw = (api: ApiClient, reason: string) =>
      walk.act(api, note, { action: 'withdraw', reason }, key)
    await withdraw(district.planner.api, 'One reason.').expect(200)
    expectProblem(await withdraw(district.planner.api, 'Another reason.'), 'idempotency-key-reused')
    expectProblem(
      await district.planner.api.act(
        `/jobs/${walked.job.id}/acts`,
        { action: 'withdraw', reason: 'One reason.' },
        key,
      ),
      'idempotency-key-reused',
    )
    expect((await reasonsOf(withdraw(district.checker.api, 'One reason.')))[0]).toContain('withdrawn')
  })

  it('that is refused may be tried again under the same key once it is ready', async () => {
    const key = randomUUID()
    const next = await walk.draft('retry@farms.example')
    const send = () => walk.act(district.planner.api, next, { action: 'send-to-landowner' }, key)
    await reasonsOf(send())
    const made = await walk.packet(next)
    await district.checker.api.act(`/packets/${made.id}/technical-check`).expect(200)
    expect((await send().expect(200)).body.state).toBe('with-landowner')
  })
})

describe('a job that a supervisor returned', () => {
  it('comes back with the notes, and its signature counts no more', async () => {
    const walked = await walk.draft('returned@farms.example')
    const { packet, landowner } = await walk.withLandowner(walked)
    await walk.sign(walked, { packet, landowner })
    const notes = ['Longer berm.', 'Wider gate.']
    const { body } = await walk.act(district.supervisor.api, walked, { action: 'return', notes }).expect(200)
    expect([body.state, body.openNotes]).toEqual(['returned', 2])
    expect(body.revisions[0].signatures).toEqual([expect.objectContaining({ isVoid: true })])
    await walk.settleNotes(walked)
    await walk.act(district.planner.api, walked, { action: 'send-to-landowner' }).expect(200)
    const again = { action: 'approve', packetSha256: packet.sha256 }
    expect((await reasonsOf(walk.act(district.supervisor.api, walked, again)))[0]).toContain('with landowner')
    await walk.sign(walked, { packet, landowner })
    const { revisions } = await walk.read(walked.job.id)
    expect(revisions[0]?.signatures.map(({ isVoid }) => isVoid)).toEqual([true, false])
  })
})
