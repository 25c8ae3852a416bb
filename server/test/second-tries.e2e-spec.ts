import type { EventView, MailView, PacketView } from 'shared'
import { MailMessage } from '../src/mail/mail-message.entity'
import { Packet } from '../src/packets/packet.entity'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let walked: Walked

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft()
})
afterAll(() => app.stop())

const tokensMailed = () =>
  app.mail.to(walked.producer.email ?? '').flatMap(({ text }) => /#t=([\w-]{43})/.exec(text ?? '')?.[1] ?? [])

describe('a packet asked for twice while it is made', () => {
  it('is the same packet, of one revision', async () => {
    const other = await walk.draft('twice@farms.example')
    const ask = () =>
      district.planner.api.act(`/jobs/${other.job.id}/packets`, { designId: other.designId }).expect(202)
    const [first, second] = [(await ask()).body as PacketView, (await ask()).body as PacketView]
    expect(second).toMatchObject({ id: first.id, revision: 1 })
    await app.drain()
    expect((await ask()).body).toMatchObject({ revision: 2 })
    await app.drain()
  })
})

describe('what the post or a drawing lost', () => {
  it('a packet that failed is made again as the same packet, and one that did not fail is not', async () => {
    const packet = await walk.packet(walked)
    const { api } = district.planner
    await api.act(`/packets/${packet.id}/make-again`).expect(409)
    const failed = { status: 'failed' as const, fileId: null, sha256: null, failure: 'no room on the disk' }
    await app.inDistrict(district.districtId, (tx) =>
      tx.manager.update(Packet, { districtId: tx.districtId, id: packet.id }, failed),
    )
    await district.supervisor.api.act(`/packets/${packet.id}/make-again`).expect(403)
    await api.act(`/packets/${packet.id}/make-again`).expect(202)
    await app.drain()
    const again: PacketView = (await api.get(`/packets/${packet.id}`).expect(200)).body
    expect(again).toMatchObject({ status: 'ready', revision: packet.revision, sha256: packet.sha256 })
  })

  it('a new link ends the one before it', async () => {
    await walk.withLandowner(walked)
    const { api } = district.office
    await api.act(`/jobs/${walked.job.id}/links`).expect(202)
    await app.drain()
    const [first, second] = tokensMailed()
    expect(second).toBeDefined()
    await app.client().post('/entry/open', { token: first }).expect(410)
    await app.client().post('/entry/open', { token: second }).expect(202)
  })

  it('a failed message goes out under its old Message-ID, once, and not while it has not failed', async () => {
    const { api } = district.office
    const path = `/jobs/${walked.job.id}/mail`
    const log: MailView[] = (await api.get(path).expect(200)).body
    const sent = log.find(({ kind }) => kind === 'entry-link')
    await api.act(`${path}/${sent?.id}/send-again`).expect(409)
    await app.drain()
    const before = app.mail.mails.length
    await app.inDistrict(district.districtId, async (tx) => {
      const change = { status: 'failed' as const, text: 'A letter without a secret.', isSecret: false }
      await tx.manager.update(MailMessage, { districtId: tx.districtId, id: sent?.id ?? '' }, change)
    })
    await api.act(`${path}/${sent?.id}/send-again`).expect(202)
    await app.drain()
    expect(app.mail.mails.slice(before).map(({ messageId }) => messageId)).toEqual([sent?.messageId])
  })

  it('is written down in the timeline', async () => {
    const events: EventView[] = (await district.planner.api.get(`/jobs/${walked.job.id}/events`)).body
    const kinds = events.map(({ kind }) => kind)
    expect(kinds).toContain('link-again')
    expect(kinds).toContain('mail-again')
  })
})
