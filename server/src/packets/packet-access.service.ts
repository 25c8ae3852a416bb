import { Injectable } from '@nestjs/common'
import { Problem, reachOf, type Permission } from 'shared'
import { JobAccessService, type Asking, type JobLock } from '../jobs/job-access.service.js'
import type { Job } from '../jobs/job.entity.js'
import type { Tx } from '../platform/database/tx.js'
import { Packet } from './packet.entity.js'

export interface FoundPacket {
  packet: Packet
  job: Job
}

const sentQuery = `
  select 1 from events
  where district_id = $1 and stream_id = $2 and kind in ('send-to-landowner', 'send') and facts ->> 'packetId' = $3
  limit 1
`

/** Finds a packet for somebody, or says that there is nothing. */
@Injectable()
export class PacketAccessService {
  constructor(private readonly jobs: JobAccessService) {}

  /**
   * @param lock `to-change` holds the job, not the packet: acts and renderings of one job then come one by one.
   * @throws Problem not-found; for a producer also while the packet was not sent.
   */
  async find(
    tx: Tx,
    asking: Asking,
    { permission, packetId, lock }: { permission: Permission; packetId: string; lock: JobLock },
  ): Promise<FoundPacket> {
    const { jobId } = await this.load(tx, packetId)
    const job = await this.jobs.find(tx, asking, permission, jobId, lock)
    // Read again: the job may have been held by an act that changed the packet in the meantime.
    const packet = await this.load(tx, packetId)
    const seesAll = reachOf(asking.actor, permission) === 'district'
    if (!seesAll && !(await this.wasSent(tx, packet))) throw new Problem('not-found')
    return { packet, job }
  }

  async load(tx: Tx, packetId: string): Promise<Packet> {
    const packet = await tx.manager.findOneBy(Packet, { districtId: tx.districtId, id: packetId })
    if (packet === null) throw new Problem('not-found')
    return packet
  }

  private async wasSent(tx: Tx, { jobId, id }: Packet): Promise<boolean> {
    const [sent] = await tx.manager.query(sentQuery, [tx.districtId, jobId, id])
    return sent !== undefined
  }
}
