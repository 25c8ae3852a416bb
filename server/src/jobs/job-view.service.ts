import { Injectable } from '@nestjs/common'
import { actionsFor, reachOf, type Actor, type JobFacts, type JobView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { JobAccessService, type Asking } from './job-access.service.js'
import { JobFactsService } from './job-facts.service.js'
import { jobViewQuery, type JobViewRow } from './job-view-query.js'
import type { Job } from './job.entity.js'
import { waitsFor } from './waits-for.js'

/** A job as the person who asks may see it, with that person's buttons. */
@Injectable()
export class JobViewService {
  constructor(
    private readonly jobs: JobAccessService,
    private readonly facts: JobFactsService,
  ) {}

  async read(tx: Tx, asking: Asking, jobId: string): Promise<JobView> {
    const job = await this.jobs.find(tx, asking, 'job:read', jobId, 'to-read')
    return this.viewOf(tx, asking.actor, job)
  }

  async viewOf(tx: Tx, actor: Actor, job: Job): Promise<JobView> {
    const facts = await this.facts.factsOf(tx, job)
    const [row]: JobViewRow[] = await tx.manager.query(jobViewQuery, [tx.districtId, job.id, actor.personId])
    if (row === undefined) throw new Error(`Job ${job.id} went away while it was read.`)
    const view = viewFrom({ job, facts, row, actor })
    return reachOf(actor, 'job:read') === 'district' ? view : forLandowner({ view, row, job })
  }
}

interface ViewParts {
  job: Job
  facts: JobFacts
  row: JobViewRow
  actor: Actor
}

function viewFrom({ job, facts, row, actor }: ViewParts): JobView {
  return {
    id: job.id,
    number: job.number,
    title: job.title,
    state: job.state,
    version: job.version,
    body: job.body,
    waterName: job.waterName,
    county: job.county,
    ...ifGiven({
      farmNumber: job.farmNumber,
      tractNumber: job.tractNumber,
      fieldNumber: job.fieldNumber,
      legalDescription: job.legalDescription,
    }),
    producers: row.producers,
    designerName: row.designerName,
    chosenDesignId: job.chosenDesignId,
    hasSurvey: row.hasSurvey,
    packetId: job.packetId,
    finalPacketId: job.finalPacketId,
    openNotes: facts.openNotes,
    revisions: row.revisions.map(({ number, packetId, madeAt, sha256, signatures }) => ({
      number,
      packetId,
      madeAt,
      sha256,
      signatures,
    })),
    actions: actionsFor(facts, actor),
    waitsFor: waitsFor[job.state],
    updatedAt: job.updatedAt.toISOString(),
  }
}

/**
 * A producer sees what was sent, and nothing of the district's own work: no draft revision, no design that is still
 * being weighed, no note of others, no packet before the office has sent it.
 */
function forLandowner({ view, row, job }: { view: JobView; row: JobViewRow; job: Job }): JobView {
  const sent = new Set(row.revisions.filter(({ wasSent }) => wasSent).map(({ packetId }) => packetId))
  return {
    ...view,
    chosenDesignId: null,
    packetId: view.packetId !== null && sent.has(view.packetId) ? view.packetId : null,
    finalPacketId: sentOrLater(job) ? view.finalPacketId : null,
    openNotes: row.myOpenNotes,
    revisions: view.revisions.filter(({ packetId }) => sent.has(packetId)),
  }
}

const sentOrLater = ({ state }: Job): boolean =>
  !['draft', 'returned', 'with-landowner', 'with-supervisor', 'approved', 'withdrawn'].includes(state)

type Given<Fields> = { [Key in keyof Fields]?: NonNullable<Fields[Key]> }

const ifGiven = <Fields extends object>(fields: Fields): Given<Fields> =>
  Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== null)) as Given<Fields>
