import { Injectable } from '@nestjs/common'
import { guards, Problem, type Actor, type JobFacts } from 'shared'
import { Membership } from '../accounts/membership.entity.js'
import { Revision } from '../designs/revision.entity.js'
import type { Asking } from '../jobs/job-access.service.js'
import { JobFactsService } from '../jobs/job-facts.service.js'
import { JobsService } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { isWithinLimits } from './is-within-limits.js'
import { PacketAccessService } from './packet-access.service.js'
import type { Packet } from './packet.entity.js'
import { TechnicalCheck } from './technical-check.entity.js'

interface CheckToRecord {
  packetId: string
  note: string | null
}

/** The check of figures and criteria. It belongs to one packet: the next revision starts without one. */
@Injectable()
export class TechnicalCheckService {
  constructor(
    private readonly packets: PacketAccessService,
    private readonly jobs: JobsService,
    private readonly jobFacts: JobFactsService,
    private readonly events: EventLog,
  ) {}

  async record(tx: Tx, asking: Asking, { packetId, note }: CheckToRecord): Promise<Packet> {
    const wanted = { permission: 'packet:check', packetId, lock: 'to-change' } as const
    const { packet, job } = await this.packets.find(tx, asking, wanted)
    this.jobs.requireEditable(job)
    const checkerId = asking.actor.personId
    refuseCheck(packet, await this.jobFacts.factsOf(tx, job), asking.actor)
    const revision = await tx.manager.findOneByOrFail(Revision, {
      districtId: tx.districtId,
      id: packet.revisionId,
    })
    const { districtId } = tx
    const checker = await tx.manager.findOneByOrFail(Membership, { districtId, personId: checkerId })
    const limits = checker.approvalLimits
    const withinLimits = isWithinLimits(limits, revision)
    await this.keep(tx, { packetId, checkerId, limits, withinLimits, note })
    await this.jobs.change(tx, job, {})
    const facts = { packetId, revision: revision.number, withinLimits }
    await this.events.append(tx, { streamId: job.id, kind: 'technically-checked', facts })
    return packet
  }

  /** A second check, such as by a person with wider limits, takes the place of the first; both stay in the events. */
  private async keep(
    tx: Tx,
    check: Pick<TechnicalCheck, 'packetId' | 'checkerId' | 'limits' | 'withinLimits' | 'note'>,
  ): Promise<void> {
    await tx.manager.save(TechnicalCheck, { ...check, districtId: tx.districtId, checkedAt: tx.at })
  }
}

/** The same two rules as for the approval: nobody judges an own design or a job that pays them. */
function refuseCheck(packet: Packet, facts: JobFacts, actor: Actor): void {
  const reasons = [
    facts.packetA?.id === packet.id
      ? null
      : 'This is not the packet of the design as it stands. Open the newest revision.',
    packet.status === 'ready' ? null : 'The packet is not made yet.',
    guards.notDesigner(facts, actor),
    guards.notPayeeOrKin(facts, actor),
  ].filter((reason) => reason !== null)
  if (reasons.length > 0) throw new Problem('transition-not-allowed', { reasons })
}
