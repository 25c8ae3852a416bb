import { Job } from '../jobs/job.entity.js'
import type { Tx } from '../platform/database/tx.js'
import type { Cast } from './cast.js'
import type { DemoJob } from './demo-district.js'
import type { DemoServices } from './demo-services.js'

export const findJob = ({ manager, districtId }: Tx, { job }: DemoJob): Promise<Job | null> =>
  manager.findOneBy(Job, { districtId, title: job.title })

/** A job with its producer, survey and designs, all of it in one transaction; one that is there stays as it is. */
export async function openJob(services: DemoServices, { planner }: Cast, demo: DemoJob): Promise<void> {
  await services.work.run(planner.actor, async (tx) => {
    if ((await findJob(tx, demo)) !== null) return
    const { view: producer } = await services.producers.create(tx, demo.producer)
    const input = { ...demo.job, producerIds: [producer.id] }
    const { id: jobId } = await services.jobs.create(tx, planner.actor.personId, input)
    if (demo.survey !== undefined) {
      await services.surveys.save(tx, planner, { jobId, version: 0, survey: demo.survey })
    }
    for (const design of demo.designs) await services.designs.create(tx, planner, jobId, design)
  })
}
