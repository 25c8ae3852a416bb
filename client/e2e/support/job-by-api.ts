import type { DesignView, JobView, PacketView, ProducerView } from 'shared'
import { ApiPerson } from './api-person'
import { mailedCode, mailedLink } from './entry-mail'
import { northPond, northPondRows } from './example'
import { Mailbox } from './mailbox'
import { signInOf } from './sign-ins'

export interface ExampleJobHere {
  job: JobView
  design: DesignView
  /** The landowner's. */
  mailbox: Mailbox
}

let made = 0

/** A draft of the north pond with its design, under a name of its own. */
export async function draftJob(): Promise<ExampleJobHere> {
  const planner = await ApiPerson.signedIn(signInOf('planner'))
  made += 1
  const sign = `${Date.now().toString(36)}${made}`
  const mailbox = new Mailbox(`owner-${sign}@farm.example`)
  const producer = await planner.post<ProducerView>('/producers', {
    ...northPond.producer,
    name: `Odile Marchbank ${sign}`,
    email: mailbox.address,
  })
  const job = await planner.post<JobView>('/jobs', {
    ...northPond.job,
    title: `North pond ${sign}`,
    producerIds: [producer.id],
  })
  const { startElevationFt, waterSurfaceFt, closing } = northPond.survey
  const survey = { kind: 'level-notes', startElevationFt, waterSurfaceFt, closing, rows: northPondRows }
  await planner.put(`/jobs/${job.id}/survey`, survey, 0)
  const design = await planner.post<DesignView>(`/jobs/${job.id}/designs`, {
    name: 'Main design',
    plan: northPond.plan,
  })
  return { job, design, mailbox }
}

export interface JobWithLandowner extends ExampleJobHere {
  packet: PacketView
  /** As it was mailed. */
  link: string
}

/** Packet made, checked by the second planner and sent to the landowner. */
export async function jobWithLandowner(): Promise<JobWithLandowner> {
  const here = await draftJob()
  const planner = await ApiPerson.signedIn(signInOf('planner'))
  const asked = await planner.act<PacketView>(`/jobs/${here.job.id}/packets`, { designId: here.design.id })
  const packet = await packetReady(planner, asked.id)
  const checker = await ApiPerson.signedIn(signInOf('planner', 1))
  await checker.act(`/packets/${packet.id}/technical-check`)
  await planner.act(`/jobs/${here.job.id}/acts`, { action: 'send-to-landowner' })
  return { ...here, packet, link: await mailedLink(here.mailbox) }
}

/** Read and signed by the landowner, who came by link and code. */
export async function jobWithSupervisor(): Promise<JobWithLandowner> {
  const here = await jobWithLandowner()
  const landowner = new ApiPerson()
  const token = here.link.split('#t=')[1]
  await landowner.post('/entry/open', { token })
  const { name } = await landowner.post<{ name: string }>('/entry/code', {
    token,
    code: await mailedCode(here.mailbox),
  })
  const packetPath = `/packets/${here.packet.id}`
  await landowner.post(`${packetPath}/consent`, { consentVersion: '2026-1', agrees: true })
  for (const { number } of here.packet.pages) {
    await landowner.post(`${packetPath}/read-pages`, { page: number })
  }
  const signature = { typedName: name, intends: true, packetSha256: here.packet.sha256 }
  await landowner.act(`/jobs/${here.job.id}/acts`, { action: 'sign', ...signature })
  return here
}

/** Approved, with the packet of the approval made: ready to be sent. */
export async function approvedJob(): Promise<JobWithLandowner> {
  const here = await jobWithSupervisor()
  const supervisor = await ApiPerson.signedIn(signInOf('supervisor'))
  const { finalPacketId } = await supervisor.act<JobView>(`/jobs/${here.job.id}/acts`, {
    action: 'approve',
    packetSha256: here.packet.sha256,
  })
  if (finalPacketId === null) throw new Error('An approval begins the final packet.')
  await packetReady(supervisor, finalPacketId)
  return here
}

async function packetReady(person: ApiPerson, id: string): Promise<PacketView> {
  for (let tries = 0; tries < 300; tries += 1) {
    const packet = await person.get<PacketView>(`/packets/${id}`)
    if (packet.status === 'ready') return packet
    if (packet.status === 'failed') throw new Error('The packet could not be made.')
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error('The packet was not made within half a minute.')
}
