import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'
import { Walk } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
})
afterAll(() => app.stop())

describe('one job from draft to sent', () => {
  it('goes through every state, and the mailed packet is the stored one byte for byte', async () => {
    const walked = await walk.draft()
    expect(walked.job.state).toBe('draft')
    const sent = await walk.withLandowner(walked)
    const asked = await walk.act(sent.landowner, walked, {
      action: 'ask-for-changes',
      note: 'Move the gate.',
    })
    expect(asked.body.state).toBe('returned')
    await walk.settleNotes(walked)
    const approved = await walk.approved(walked)
    expect(approved.state).toBe('approved')
    const send = { action: 'send', addressConfirmed: true }
    const done = await walk.act(district.office.api, walked, send).expect(200)
    expect(done.body.state).toBe('sent')
    await app.drain()
    const [packetMail] = app.mail
      .to(walked.producer.email ?? '')
      .filter(({ attachments }) => attachments.length > 0)
    const file = await district.office.api.get(`/packets/${approved.finalPacketId}/file`).responseType('blob')
    expect(packetMail?.attachments[0]?.content.equals(file.body)).toBe(true)
  })
})
