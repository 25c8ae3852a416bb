import type { DesignView, JobView, NoteView, PacketView, ProducerView } from 'shared'
import type { ApiClient } from './api-client'
import { readExample } from './example'
import type { ReadyDistrict } from './ready-district'
import type { TestApp } from './test-app'

export interface Walked {
  job: JobView
  designId: string
  producer: ProducerView
}

/** The steps of one job by the API, each as the person whose step it is. */
export class Walk {
  constructor(
    private readonly app: TestApp,
    private readonly district: ReadyDistrict,
  ) {}

  /** A draft with survey and a complete, chosen design. The producer has an e-mail. */
  async draft(email = `producer.${Date.now()}@farms.example`): Promise<Walked> {
    const { job: example, survey } = readExample('north-pond')
    const { api } = this.district.planner
    const producer = (await api.post('/producers', { ...example.producer, email }).expect(201)).body
    const job = (await api.post('/jobs', { ...example.job, producerIds: [producer.id] }).expect(201)).body
    await api.put(`/jobs/${job.id}/survey`, survey, { version: 0 }).expect(200)
    const body = { name: 'First design', plan: example.plan }
    const design: DesignView = (await api.post(`/jobs/${job.id}/designs`, body).expect(201)).body
    return { job: await this.read(job.id), designId: design.id, producer }
  }

  async read(jobId: string): Promise<JobView> {
    return (await this.district.planner.api.get(`/jobs/${jobId}`).expect(200)).body
  }

  /** Packet A, made by the queue. */
  async packet({ job, designId }: Walked): Promise<PacketView> {
    const { api } = this.district.planner
    const { id } = (await api.act(`/jobs/${job.id}/packets`, { designId }).expect(202)).body
    await this.app.drain()
    const packet: PacketView = (await api.get(`/packets/${id}`).expect(200)).body
    if (packet.status !== 'ready') throw new Error(`The packet is ${packet.status}.`)
    return packet
  }

  /** Packet A, checked and with the landowner, who has come in by the mailed link and code. */
  async withLandowner(walked: Walked): Promise<{ packet: PacketView; landowner: ApiClient }> {
    const packet = await this.packet(walked)
    await this.district.checker.api.act(`/packets/${packet.id}/technical-check`).expect(200)
    await this.act(this.district.planner.api, walked, { action: 'send-to-landowner' }).expect(200)
    return { packet, landowner: await this.comeByMail(walked) }
  }

  async comeByMail({ producer: { email = '' } }: Walked): Promise<ApiClient> {
    const landowner = this.app.client()
    const token = await this.newestIn(email, /#t=([\w-]{43})/)
    await landowner.post('/entry/open', { token }).expect(202)
    const code = await this.newestIn(email, /\b(\d{6})\b/)
    await landowner.post('/entry/code', { token, code }).expect(201)
    return landowner
  }

  /** Consents, reads every page and signs. */
  async sign(
    walked: Walked,
    { packet, landowner }: { packet: PacketView; landowner: ApiClient },
  ): Promise<JobView> {
    await landowner
      .post(`/packets/${packet.id}/consent`, { consentVersion: '2026-1', agrees: true })
      .expect(200)
    for (const { number } of packet.pages) {
      await landowner.post(`/packets/${packet.id}/read-pages`, { page: number }).expect(200)
    }
    return (await this.act(landowner, walked, signature(packet)).expect(200)).body
  }

  async withSupervisor(walked: Walked): Promise<PacketView> {
    const sent = await this.withLandowner(walked)
    await this.sign(walked, sent)
    return sent.packet
  }

  /** Approved, and packet B made. */
  async approved(walked: Walked): Promise<JobView> {
    const packet = await this.withSupervisor(walked)
    const approve = { action: 'approve', packetSha256: packet.sha256 }
    await this.act(this.district.supervisor.api, walked, approve).expect(200)
    await this.app.drain()
    return this.read(walked.job.id)
  }

  act(api: ApiClient, { job }: Walked, act: object, key?: string) {
    return api.act(`/jobs/${job.id}/acts`, act, key)
  }

  /** Answers and settles all open notes, so that the job can go out again. */
  async settleNotes({ job }: Walked): Promise<void> {
    const { api } = this.district.planner
    const notes: NoteView[] = (await api.get(`/jobs/${job.id}/notes`).expect(200)).body
    for (const { id } of notes.filter(({ status }) => status === 'open')) {
      await api.post(`/notes/${id}/answer`, { text: 'Done.' }).expect(200)
      await api.post(`/notes/${id}/settle`).expect(200)
    }
  }

  private async newestIn(email: string, pattern: RegExp): Promise<string> {
    await this.app.drain()
    const found = this.app.mail
      .to(email)
      .map(({ text }) => pattern.exec(text ?? '')?.[1])
      .filter((text) => text !== undefined)
      .at(-1)
    if (found === undefined) throw new Error(`No mail to ${email} fits ${pattern}.`)
    return found
  }
}

export const signature = (packet: PacketView) => ({
  action: 'sign',
  typedName: 'Odile Marchbank',
  intends: true,
  packetSha256: packet.sha256,
})
