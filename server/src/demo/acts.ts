import type { Act } from 'shared'
import { withAccounts } from '../platform/database/unit-of-work.js'
import type { Tx } from '../platform/database/tx.js'
import type { Asking } from '../jobs/job-access.service.js'
import type { Job } from '../jobs/job.entity.js'
import { Packet } from '../packets/packet.entity.js'
import { Producer } from '../producers/producer.entity.js'
import { actingAs, type Cast } from './cast.js'
import type { DemoJob } from './demo-district.js'
import type { DemoServices } from './demo-services.js'
import type { DemoAct } from './paths.js'

export interface ActScene {
  cast: Cast
  demo: DemoJob
  job: Job
}

type Perform = (services: DemoServices, tx: Tx, scene: ActScene) => Promise<void>

const consentVersion = '2026-1'
const userAgent = 'example data'

/** Who does what, and with which words. */
export const demoActs: Readonly<Record<DemoAct, Perform>> = {
  check: async (services, tx, { cast, job }) => {
    const { id: packetId } = await packetOf(tx, job)
    const note = 'Figures, levels and sources agree.'
    await services.checks.record(actingAs(tx, cast.checker), cast.checker, { packetId, note })
  },
  invite: (services, tx, { cast, job }) =>
    apply(services, tx, cast.planner, job, { action: 'send-to-landowner' }),
  'ask-for-changes': async (services, tx, { demo, job }) => {
    const landowner = await landownerOf(tx, demo, job)
    await readPages(services, tx, landowner, { ...(await packetOf(tx, job)), pages: 4 })
    await apply(services, tx, landowner, job, { action: 'ask-for-changes', note: wordsOf(demo), page: 4 })
  },
  sign: async (services, tx, { demo, job }) => {
    const landowner = await landownerOf(tx, demo, job)
    const packet = await packetOf(tx, job)
    const byLandowner = actingAs(tx, landowner)
    await services.readings.consent(byLandowner, landowner, { packetId: packet.id, consentVersion })
    await readPages(services, tx, landowner, packet)
    const signed = { typedName: demo.producer.name, intends: true, packetSha256: packet.sha256 } as const
    await apply(services, tx, landowner, job, { action: 'sign', ...signed })
  },
  approve: async (services, tx, { cast, job }) => {
    const { sha256: packetSha256 } = await packetOf(tx, job)
    await apply(services, tx, cast.supervisor, job, { action: 'approve', packetSha256 })
  },
  send: (services, tx, { cast, job }) =>
    apply(services, tx, cast.office, job, { action: 'send', addressConfirmed: true }),
  withdraw: (services, tx, { cast, demo, job }) =>
    apply(services, tx, cast.planner, job, { action: 'withdraw', reason: wordsOf(demo) }),
}

/** An act belongs to a session, as everywhere; it ends with the act, so that nobody is left signed in. */
async function apply(
  { acts, sessions }: DemoServices,
  tx: Tx,
  asking: Asking,
  job: Job,
  act: Act,
): Promise<void> {
  const { personId, districtId } = asking.actor
  const own = asking.onlyJobId === null ? {} : { jobId: asking.onlyJobId }
  const start = { personId, districtId, userAgent, ...own }
  const { id: sessionId } = await withAccounts(tx, (accounts) => sessions.begin(accounts, start))
  const origin = { sessionId, cameByLink: asking.onlyJobId !== null, remoteAddress: '127.0.0.1', userAgent }
  await acts.apply(actingAs(tx, asking), asking, { jobId: job.id, act, origin })
  await withAccounts(tx, (accounts) => sessions.end(accounts, personId, sessionId))
}

interface MadePacket {
  id: string
  sha256: string
  pages: number
}

async function packetOf({ manager, districtId }: Tx, { packetId, title }: Job): Promise<MadePacket> {
  const packet = packetId === null ? null : await manager.findOneBy(Packet, { districtId, id: packetId })
  if (packet === null || packet.sha256 === null)
    throw new Error(`The packet of the example job "${title}" is not made.`)
  return { id: packet.id, sha256: packet.sha256, pages: packet.pages?.length ?? 0 }
}

async function readPages(
  { readings }: DemoServices,
  tx: Tx,
  landowner: Asking,
  packet: MadePacket,
): Promise<void> {
  for (let page = 1; page <= packet.pages; page += 1) {
    await readings.read(actingAs(tx, landowner), landowner, { packetId: packet.id, page })
  }
}

/** As by the mailed link: the one job and nothing else. */
async function landownerOf({ manager, districtId }: Tx, { producer }: DemoJob, job: Job): Promise<Asking> {
  const { email = '' } = producer
  const { personId } = await manager.findOneByOrFail(Producer, { districtId, email })
  if (personId === null) throw new Error(`${producer.name} has no e-mail and cannot sign here.`)
  return { actor: { personId, districtId, roles: ['landowner'] }, onlyJobId: job.id }
}

function wordsOf({ words, job }: DemoJob): string {
  if (words === undefined) throw new Error(`The example job "${job.title}" lacks its words.`)
  return words
}
