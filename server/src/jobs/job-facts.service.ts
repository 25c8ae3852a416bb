import { Injectable } from '@nestjs/common'
import type { DesignResult, JobFacts } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { JobAccessService, type JobLock } from './job-access.service.js'
import { jobFactsQuery, type JobFactsRow } from './job-facts-query.js'
import type { Job } from './job.entity.js'

export interface GatheredJob {
  job: Job
  facts: JobFacts
}

/** Gathers all that the workflow's guards look at. An act asks for it `to-change` and decides while the row is held. */
@Injectable()
export class JobFactsService {
  constructor(private readonly jobs: JobAccessService) {}

  async gather(tx: Tx, jobId: string, lock: JobLock): Promise<GatheredJob> {
    const job = await this.jobs.load(tx, jobId, lock)
    return { job, facts: await this.factsOf(tx, job) }
  }

  async factsOf(tx: Tx, job: Job): Promise<JobFacts> {
    const [row]: JobFactsRow[] = await tx.manager.query(jobFactsQuery, [tx.districtId, job.id])
    if (row === undefined) throw new Error(`Job ${job.id} went away while its facts were gathered.`)
    return {
      jobId: job.id,
      districtId: job.districtId,
      state: job.state,
      designerId: row.designerId,
      designerIds: row.designerIds,
      payeeAndKinIds: row.payeeIds,
      packetA: row.packetAId === null ? null : { id: row.packetAId, sha256: row.packetASha256 },
      technicalCheck:
        row.checkerId === null ? null : { checkerId: row.checkerId, withinLimits: row.withinLimits === true },
      failingChecksWithoutVariance: failing(row.checks, row.varied),
      openNotes: row.openNotes,
      landownerAddressKnown: row.everySignerReachable,
      requiredSignerIds: row.signerIds,
      signedByIds: row.signedByIds,
      consentedIds: row.consentedIds,
      hasReadIds: row.hasReadIds,
      packetB: row.packetBId === null ? null : { id: row.packetBId, sha256: row.packetBSha256 },
      checkerMayApprove: row.checkerMayApprove,
      ...notRecordedYet,
    }
  }
}

const failing = (checks: DesignResult['checks'] | null, varied: readonly string[]): number =>
  (checks ?? []).filter(({ id, verdict }) => verdict === 'fail' && !varied.includes(id)).length

/** No table holds these yet. Each stands as a district without any record of it: nothing is spent, built or measured. */
const notRecordedYet = {
  budgetLeft: true,
  permitsRecorded: false,
  utilityTicketRecorded: false,
  everyQuantityMeasured: false,
  ticketsMatch: false,
  measurerId: null,
  certifierIds: [],
  changeOrderOpen: false,
  finalPaymentWithinPayable: false,
  inspectionDatesSet: false,
} as const
