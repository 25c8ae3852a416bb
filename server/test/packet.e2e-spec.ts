import { createHash } from 'node:crypto'
import {
  moneyText,
  numberText,
  readyValue,
  type DesignView,
  type EventView,
  type JobView,
  type PacketView,
} from 'shared'
import { PacketRendererService } from '../src/packets/packet-renderer.service'
import { expectProblem } from './support/expect-problem'
import { pageTexts, qpdfCheck } from './packets/pdf-tools'
import { drainAgain, waitingTasks } from './support/queue-time'
import { makeReadyDistrict, type ReadyDistrict } from './support/ready-district'
import { startTestApp, type TestApp } from './support/test-app'
import { signature, Walk, type Walked } from './support/walk'

let app: TestApp
let district: ReadyDistrict
let walk: Walk
let walked: Walked
let design: DesignView
let packetA: PacketView
let packetB: PacketView
let bytesOfA: Buffer
let bytesOfB: Buffer

const bytesOf = async ({ id }: { id: string }): Promise<Buffer> =>
  (await district.office.api.get(`/packets/${id}/file`).responseType('blob').expect(200)).body

const sha256 = (bytes: Buffer): string => createHash('sha256').update(bytes).digest('hex')

const words = (text: string): string => text.replace(/\s+/g, ' ')

beforeAll(async () => {
  app = await startTestApp()
  district = await makeReadyDistrict(app, 'Sable Basin District (example)')
  walk = new Walk(app, district)
  walked = await walk.draft()
  const { planner, supervisor } = district
  design = (await planner.api.get(`/designs/${walked.designId}`)).body
  const sent = await walk.withLandowner(walked)
  packetA = sent.packet
  bytesOfA = await bytesOf(packetA)
  await walk.sign(walked, sent)
  const approve = { action: 'approve', packetSha256: packetA.sha256, agendaItem: 'Item 7' }
  await walk.act(supervisor.api, walked, approve).expect(200)
  await app.drain()
  const { finalPacketId } = await walk.read(walked.job.id)
  packetB = (await planner.api.get(`/packets/${finalPacketId}`).expect(200)).body
  bytesOfB = await bytesOf(packetB)
})
afterEach(() => jest.restoreAllMocks())
afterAll(() => app.stop())

describe('packet A', () => {
  it('has at least nine pages, as many as it says, and is sound for qpdf', () => {
    expect(packetA.pages.length).toBeGreaterThanOrEqual(9)
    expect(packetA.pages.map(({ number }) => number)).toEqual(packetA.pages.map((_, index) => index + 1))
    expect(pageTexts(bytesOfA)).toHaveLength(packetA.pages.length)
    expect(qpdfCheck(bytesOfA)).toContain('No syntax or stream encoding errors found')
  })

  it('is stored byte for byte under the hash and size that are shown', async () => {
    expect(packetA).toMatchObject({
      kind: 'A',
      revision: 1,
      sha256: sha256(bytesOfA),
      sizeBytes: bytesOfA.length,
    })
    const answer = await district.planner.api.get(`/packets/${packetA.id}/file`)
    expect(answer.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-disposition': `inline; filename="${walked.job.number}-A-1.pdf"`,
      etag: `"${packetA.sha256}"`,
      'cache-control': 'no-store',
    })
  })

  it('prints the stone, the cost and the share of the landowner of this very design', () => {
    const text = words(pageTexts(bytesOfA).join(' '))
    const { rock, cost, funding } = design.result
    const tons = numberText(readyValue(rock)?.totalOrderTons ?? Number.NaN, 1)
    const total = moneyText(readyValue(cost)?.typical ?? '')
    const share = moneyText(readyValue(funding)?.landownerShare ?? '')
    expect(text).toContain(`${tons} tons`)
    expect(text).toMatch(new RegExp(`Total \\${total}`))
    expect(text).toMatch(new RegExp(`Landowner’s share \\${share}`))
    expect(text).toContain(`Estimated cost ${total}. All funds together`)
  })

  it('has the same figures on its page of text as the list of jobs shows', async () => {
    const { body } = await district.planner.api.get('/jobs').expect(200)
    const row = body.jobs.find(({ id }: { id: string }) => id === walked.job.id)
    expect(row).toMatchObject({
      stoneOrderTons: readyValue(design.result.rock)?.totalOrderTons,
      landownerShare: readyValue(design.result.funding)?.landownerShare,
    })
  })

  it('names the district, the job, the landowner and the designer, and every page its job and revision', () => {
    const pages = pageTexts(bytesOfA).map(words)
    for (const name of ['Sable Basin District (example)', 'Odile Marchbank', 'Ines Varga']) {
      expect(pages[0]).toContain(name)
    }
    for (const page of pages) expect(page).toContain(walked.job.number)
  })

  it('stays the very bytes that were signed after packet B was made', async () => {
    expect((await bytesOf(packetA)).equals(bytesOfA)).toBe(true)
    const { body } = await district.planner.api.get(`/packets/${packetA.id}`)
    expect(body.sha256).toBe(packetA.sha256)
  })
})

describe('packet B', () => {
  it('repeats the pages of packet A word for word, and adds evidence', () => {
    const [a, b] = [pageTexts(bytesOfA), pageTexts(bytesOfB)]
    expect(b.slice(0, a.length)).toEqual(a)
    expect(b.length).toBeGreaterThan(a.length)
    expect(packetB).toMatchObject({ kind: 'B', revision: 1, sha256: sha256(bytesOfB) })
    expect(qpdfCheck(bytesOfB)).toContain('No syntax or stream encoding errors found')
  })

  it('names the hash of packet A, who signed, who checked, who approved and the last event', async () => {
    const evidence = words(pageTexts(bytesOfB).slice(packetA.pages.length).join(' '))
    const named = [packetA.sha256, signature(packetA).typedName, 'Ravi Sund', 'Tomas Quill', 'Item 7']
    for (const word of [...named, '127.0.0.1']) expect(evidence).toContain(word)
    const [, last, hash] = /Last event number (\d+) Its hash (\w{64})/.exec(evidence) ?? []
    const { body } = await district.planner.api.get(`/jobs/${walked.job.id}/events`)
    const events: EventView[] = body
    expect(events[Number(last) - 1]?.rowHash).toBe(hash)
    const approval = events.find(({ kind }) => kind === 'approve')
    expect(Number(last)).toBeGreaterThanOrEqual(approval?.sequence ?? Number.NaN)
  })
})

describe('a packet that cannot be drawn', () => {
  const ask = async (job: JobView, designId: string): Promise<PacketView> =>
    (await district.planner.api.act(`/jobs/${job.id}/packets`, { designId }).expect(202)).body
  const read = async ({ id }: PacketView): Promise<PacketView> =>
    (await district.planner.api.get(`/packets/${id}`).expect(200)).body
  const renderer = () => jest.spyOn(app.nest.get(PacketRendererService, { strict: false }), 'render')

  it('once is drawn on the next try, without a word to anybody', async () => {
    const { job, designId } = await walk.draft('again@farms.example')
    renderer().mockRejectedValueOnce(new Error('out of ink'))
    const packet = await ask(job, designId)
    await app.drain()
    expect((await read(packet)).status).toBe('making')
    expectProblem(await district.planner.api.get(`/packets/${packet.id}/file`), 'not-found')
    await drainAgain(app)
    expect((await read(packet)).status).toBe('ready')
  })

  it('at four tries is failed, says so on the desk, and a new one can be made', async () => {
    const { job, designId } = await walk.draft('never@farms.example')
    const render = renderer().mockRejectedValue(new Error('out of ink'))
    const packet = await ask(job, designId)
    for (let attempt = 1; attempt <= 6; attempt++) await drainAgain(app)
    expect(render).toHaveBeenCalledTimes(4)
    expect(await waitingTasks(app)).toBe(0)
    expect(await read(packet)).toMatchObject({ status: 'failed', sha256: null, sizeBytes: null })
    const { body: desk } = await district.planner.api.get('/desk').expect(200)
    expect(desk.find(({ jobId }: { jobId: string }) => jobId === job.id)?.sentence).toBe(
      'The packet could not be made. Make it again.',
    )
    expectProblem(
      await district.planner.api.act(`/jobs/${job.id}/acts`, { action: 'send-to-landowner' }),
      'transition-not-allowed',
    )
    jest.restoreAllMocks()
    const again = await ask(job, designId)
    await app.drain()
    expect(await read(again)).toMatchObject({ status: 'ready', revision: 2 })
    expect((await walk.read(job.id)).packetId).toBe(again.id)
  })

  it('is made once though two workers take it up at the same time', async () => {
    const { job, designId } = await walk.draft('twice@farms.example')
    const packet = await ask(job, designId)
    await Promise.all([app.drain(), app.drain()])
    const { status, sha256: hash } = await read(packet)
    expect([status, hash]).toEqual(['ready', sha256(await bytesOf(packet))])
    const { body } = await district.planner.api.get(`/jobs/${job.id}/events`)
    expect(body.filter(({ kind }: { kind: string }) => kind === 'packet-ready')).toHaveLength(1)
  })
})
