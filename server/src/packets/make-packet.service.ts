import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import { Problem, type PacketView } from 'shared'
import { FreezeDesignService } from '../designs/freeze-design.service.js'
import { Revision } from '../designs/revision.entity.js'
import { JobAccessService, type Asking } from '../jobs/job-access.service.js'
import { JobsService } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { Queue } from '../platform/queue/queue.service.js'
import { SignaturesService } from '../signatures/signatures.service.js'
import { PacketAccessService } from './packet-access.service.js'
import { Packet } from './packet.entity.js'
import { renderPacketTask, type RenderPacketPayload } from './render-packet-task.js'

interface PacketToMake {
  jobId: string
  revisionId: string
  revision: number
  kind: PacketView['kind']
}

/** A drawing that fails four times fails for a reason that waiting does not cure. */
const mostTries = 4

/** Opens packets: a row that waits, and the task that makes it, in one transaction. */
@Injectable()
export class MakePacketService {
  constructor(
    private readonly access: JobAccessService,
    private readonly packets: PacketAccessService,
    private readonly jobs: JobsService,
    private readonly designs: FreezeDesignService,
    private readonly signatures: SignaturesService,
    private readonly events: EventLog,
    private readonly queue: Queue,
  ) {}

  /** Packet A: freezes the design as the next revision. What was signed before is void from now on. */
  async makeForReading(
    tx: Tx,
    asking: Asking,
    { jobId, designId }: { jobId: string; designId: string },
  ): Promise<Packet> {
    const { packetId } = await this.access.find(tx, asking, 'packet:make', jobId, 'to-change')
    const underWay = packetId === null ? null : await this.underWay(tx, { packetId, designId })
    if (underWay !== null) return underWay
    const revision = await this.designs.freeze(tx, jobId, designId)
    await this.voidEarlierSignatures(tx, jobId, revision.number)
    const packet = await this.open(tx, {
      jobId,
      revisionId: revision.id,
      revision: revision.number,
      kind: 'A',
    })
    // Read now, since freezing has moved the job's version on.
    const job = await this.access.load(tx, jobId, 'to-change')
    await this.jobs.change(tx, job, { packetId: packet.id })
    return packet
  }

  /** Asked for twice at once, as by two windows: whatever changes the design takes the packet off the job first. */
  private async underWay(
    tx: Tx,
    { packetId, designId }: { packetId: string; designId: string },
  ): Promise<Packet | null> {
    const packet = await this.packets.load(tx, packetId)
    if (packet.status !== 'waiting' && packet.status !== 'making') return null
    const { districtId } = tx
    const isSame = await tx.manager.existsBy(Revision, { districtId, id: packet.revisionId, designId })
    return isSame ? packet : null
  }

  /** Packet B of an approved revision. */
  async makeFinal(tx: Tx, packetA: Packet, revision: number): Promise<Packet> {
    return this.open(tx, { jobId: packetA.jobId, revisionId: packetA.revisionId, revision, kind: 'B' })
  }

  /**
   * Draws a packet that could not be made once more. It stays the same packet, of the same revision.
   *
   * @throws Problem transition-not-allowed unless it failed.
   */
  async makeAgain(tx: Tx, asking: Asking, packetId: string): Promise<Packet> {
    const wanted = { permission: 'packet:make-again', packetId, lock: 'to-change' } as const
    const { packet } = await this.packets.find(tx, asking, wanted)
    if (packet.status !== 'failed') {
      const reason = 'Only a packet that could not be made is made again.'
      throw new Problem('transition-not-allowed', { detail: reason, reasons: [reason] })
    }
    const change = { status: 'waiting' as const, failure: null, requestedAt: tx.at }
    await tx.manager.update(Packet, { districtId: tx.districtId, id: packet.id }, change)
    await this.enqueue(tx, packet.id)
    return Object.assign(packet, change)
  }

  private async enqueue(tx: Tx, packetId: string): Promise<void> {
    const payload: RenderPacketPayload = { districtId: tx.districtId, packetId }
    await this.queue.add(tx, renderPacketTask, payload, { maxAttempts: mostTries })
  }

  private async open(tx: Tx, { jobId, revisionId, revision, kind }: PacketToMake): Promise<Packet> {
    const packet = tx.manager.create(Packet, {
      districtId: tx.districtId,
      id: randomUUID(),
      jobId,
      revisionId,
      kind,
      status: 'waiting',
      view: null,
      viewVersion: null,
      pages: null,
      fileId: null,
      sha256: null,
      sizeBytes: null,
      failure: null,
      requestedBy: tx.personId ?? undefined,
      requestedAt: tx.at,
      readyAt: null,
    })
    await tx.manager.insert(Packet, packet)
    const facts = { packetId: packet.id, kind, revision }
    await this.events.append(tx, { streamId: jobId, kind: 'packet-asked', facts })
    await this.enqueue(tx, packet.id)
    return packet
  }

  private async voidEarlierSignatures(tx: Tx, jobId: string, revision: number): Promise<void> {
    const reason = `Revision ${revision} took the place of what was signed.`
    const signatureIds = await this.signatures.voidStanding(tx, { jobId, reason })
    if (signatureIds.length === 0) return
    const facts = { signatureIds, revision: revision - 1, supersededBy: revision }
    await this.events.append(tx, { streamId: jobId, kind: 'signatures-voided', facts })
  }
}
