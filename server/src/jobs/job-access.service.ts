import { Injectable } from '@nestjs/common'
import { Problem, reachOf, type Actor, type Permission } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { Job } from './job.entity.js'

/** Who asks: the person, and the one job that a mailed link opens. */
export interface Asking {
  actor: Actor
  /** Null for a sign-in by password. */
  onlyJobId: string | null
}

export type JobLock = 'to-read' | 'to-change'

/** Finds a job for somebody, or says that there is nothing: never that it exists and belongs to others. */
@Injectable()
export class JobAccessService {
  /**
   * @param lock `to-change` holds the row until the transaction ends, so that two acts on one job come one by one.
   * @throws Problem not-found for a job of another district, of another producer, or of nobody.
   */
  async find(tx: Tx, asking: Asking, permission: Permission, jobId: string, lock: JobLock): Promise<Job> {
    const job = await this.load(tx, jobId, lock)
    if (!(await this.reaches(tx, asking, permission, job.id))) throw new Problem('not-found')
    return job
  }

  /** For a service that has no person before it, such as a queue task. */
  async load(tx: Tx, jobId: string, lock: JobLock): Promise<Job> {
    const job = await tx.manager.findOne(Job, {
      where: { districtId: tx.districtId, id: jobId },
      ...(lock === 'to-change' ? { lock: { mode: 'pessimistic_write' } } : {}),
    })
    if (job === null) throw new Problem('not-found')
    return job
  }

  private async reaches(tx: Tx, asking: Asking, permission: Permission, jobId: string): Promise<boolean> {
    const { actor, onlyJobId } = asking
    if (onlyJobId !== null && onlyJobId !== jobId) return false
    const reach = reachOf(actor, permission)
    if (reach !== 'own') return reach === 'district'
    const [own] = await tx.manager.query(
      `select 1 from job_producers jp
       join producers p on p.district_id = jp.district_id and p.id = jp.producer_id
       where jp.district_id = $1 and jp.job_id = $2 and p.person_id = $3`,
      [tx.districtId, jobId, actor.personId],
    )
    return own !== undefined
  }
}
