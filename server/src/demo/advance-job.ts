import type { Job } from '../jobs/job.entity.js'
import type { Tx } from '../platform/database/tx.js'
import { demoActs } from './acts.js'
import type { Cast } from './cast.js'
import type { DemoJob } from './demo-district.js'
import type { DemoServices } from './demo-services.js'
import { findJob } from './open-job.js'
import { pathTo, type Stretch } from './paths.js'

/** Brings a job to its state. Where a seeding was cut short it goes on from where the job stands. */
export async function advanceJob(services: DemoServices, cast: Cast, demo: DemoJob): Promise<void> {
  for (const stretch of pathTo[demo.state]) {
    const job = await services.work.run(cast.planner.actor, (tx) => knownJob(tx, demo))
    if (job.state !== stretch.from) continue
    await makePacket(services, cast, job, stretch)
    await services.work.run(cast.planner.actor, async (tx) => {
      for (const act of stretch.acts) {
        await demoActs[act](services, tx, { cast, demo, job: await knownJob(tx, demo) })
      }
    })
  }
}

async function knownJob(tx: Tx, demo: DemoJob): Promise<Job> {
  const job = await findJob(tx, demo)
  if (job === null) throw new Error(`The example job "${demo.job.title}" went away.`)
  return job
}

/** Made here and now; the task in the queue, which no server works off yet, then finds it made. */
async function makePacket(
  services: DemoServices,
  { districtId, planner }: Cast,
  job: Job,
  { packet }: Stretch,
): Promise<void> {
  if (packet === null) return
  const packetId = packet === 'B' ? job.finalPacketId : (job.packetId ?? (await askForPacket(job)))
  if (packetId === null) throw new Error(`The example job "${job.title}" has no packet ${packet}.`)
  await services.renderer.make({ districtId, packetId })

  async function askForPacket({ id: jobId, chosenDesignId }: Job): Promise<string> {
    if (chosenDesignId === null) throw new Error(`The example job "${job.title}" has no design.`)
    const wanted = { jobId, designId: chosenDesignId }
    const made = await services.work.run(planner.actor, (tx) =>
      services.packets.makeForReading(tx, planner, wanted),
    )
    return made.id
  }
}
