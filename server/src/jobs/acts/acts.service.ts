import { Injectable } from '@nestjs/common'
import { decide, Problem, type Act, type JobState, type JobView } from 'shared'
import type { Tx } from '../../platform/database/tx.js'
import { EventLog } from '../../platform/events/event-log.service.js'
import { SignaturesService } from '../../signatures/signatures.service.js'
import { JobAccessService, type Asking } from '../job-access.service.js'
import { JobFactsService, type GatheredJob } from '../job-facts.service.js'
import { JobViewService } from '../job-view.service.js'
import { Job } from '../job.entity.js'
import { ActNoticesService } from './act-notices.service.js'
import { ActRecordersService } from './act-recorders.service.js'
import { actRequest } from './act-request.js'
import type { ActContext, ActEffect, ActOrigin } from './act-context.js'

export interface ActToApply {
  jobId: string
  act: Act
  origin: ActOrigin
}

/** Moves jobs. Nobody else writes the state of a job. */
@Injectable()
export class ActsService {
  constructor(
    private readonly jobs: JobAccessService,
    private readonly jobFacts: JobFactsService,
    private readonly views: JobViewService,
    private readonly recorders: ActRecordersService,
    private readonly notices: ActNoticesService,
    private readonly signatures: SignaturesService,
    private readonly events: EventLog,
  ) {}

  /**
   * Applies one act in the transaction given: the facts are read while the job's row is held, decided upon, and all
   * that follows is written or none of it.
   */
  async apply(tx: Tx, asking: Asking, { jobId, act, origin }: ActToApply): Promise<JobView> {
    await this.jobs.find(tx, asking, 'job:act', jobId, 'to-change')
    const gathered = await this.jobFacts.gather(tx, jobId, 'to-change')
    const to = decided(gathered, asking, act)
    const context: ActContext = {
      ...gathered,
      act,
      origin,
      to,
      actor: asking.actor,
      revision: await this.recorders.revisionOf(tx, gathered.job),
    }
    const effect = await this.recorders.record(tx, context)
    const job = await this.move(tx, context, effect)
    await this.tell(tx, context, effect)
    if (to === 'returned') await this.voidSignatures(tx, context)
    await this.notices.post(tx, context)
    return this.views.viewOf(tx, asking.actor, job)
  }

  /** Even with the row held, the state and version that were decided upon must still be there. */
  private async move(tx: Tx, { job, to }: ActContext, { finalPacketId }: ActEffect): Promise<Job> {
    const change = {
      state: to,
      version: job.version + 1,
      updatedAt: tx.at,
      ...(to === job.state ? {} : { stateSince: tx.at }),
      ...(finalPacketId === undefined ? {} : { finalPacketId }),
    }
    const decidedUpon = { districtId: tx.districtId, id: job.id, state: job.state, version: job.version }
    const { affected } = await tx.manager.update(Job, decidedUpon, change)
    if (affected !== 1) {
      throw new Problem('transition-not-allowed', {
        reasons: ['The job was changed by somebody else just now. Look at it again.'],
      })
    }
    return tx.manager.create(Job, { ...job, ...change })
  }

  private async tell(tx: Tx, context: ActContext, { facts }: ActEffect): Promise<void> {
    const { job, act, to, revision, facts: before } = context
    const packetId = before.packetA?.id ?? null
    await this.events.append(tx, {
      streamId: job.id,
      kind: act.action,
      facts: { from: job.state, to, packetId, revision, ...facts },
    })
  }

  /** A job that went back is signed anew, even when its packet stays the same. */
  private async voidSignatures(tx: Tx, { job, revision }: ActContext): Promise<void> {
    const reason = 'The job was returned.'
    const signatureIds = await this.signatures.voidStanding(tx, { jobId: job.id, reason })
    if (signatureIds.length === 0) return
    await this.events.append(tx, {
      streamId: job.id,
      kind: 'signatures-voided',
      facts: { signatureIds, revision },
    })
  }
}

function decided({ facts }: GatheredJob, { actor }: Asking, act: Act): JobState {
  const decision = decide(facts, act.action, actor, actRequest(act))
  if (decision.allowed) return decision.to
  const { problem, reasons } = decision
  throw new Problem(problem, { reasons, detail: reasons.join(' ') })
}
