import { Injectable } from '@nestjs/common'
import { Problem, stateWords, type JobState } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { JobAccessService, type Asking } from './job-access.service.js'
import { Job } from './job.entity.js'

/** While a job is in one of these, its survey and designs may change. */
const editableStates: readonly JobState[] = ['draft', 'returned']

/** What else of the row follows when its design changes. The state is written by the acts alone. */
export type JobChange = Partial<
  Pick<Job, 'chosenDesignId' | 'packetId' | 'gradeRunPerRise' | 'stoneOrderTons' | 'landownerShare'>
>

@Injectable()
export class JobsService {
  constructor(private readonly jobs: JobAccessService) {}

  /**
   * Holds the row of a job whose survey or design is about to change.
   *
   * @throws Problem transition-not-allowed once somebody has been sent the packet.
   */
  async holdEditable(
    tx: Tx,
    asking: Asking,
    permission: 'survey:write' | 'design:write',
    jobId: string,
  ): Promise<Job> {
    const job = await this.jobs.find(tx, asking, permission, jobId, 'to-change')
    this.requireEditable(job)
    return job
  }

  requireEditable(job: Job): void {
    if (editableStates.includes(job.state)) return
    const reason = `A job that is ${stateWords[job.state]} cannot be changed. It must be returned first.`
    throw new Problem('transition-not-allowed', { detail: reason, reasons: [reason] })
  }

  /** Writes a change beside the state, and moves the job to the top of the list. */
  async change(tx: Tx, job: Job, change: JobChange): Promise<Job> {
    const changed = { ...change, version: job.version + 1, updatedAt: tx.at }
    await tx.manager.update(Job, { districtId: tx.districtId, id: job.id }, changed)
    return Object.assign(job, changed)
  }
}
