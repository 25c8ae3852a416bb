import { Injectable } from '@nestjs/common'
import { JobAccessService } from '../jobs/job-access.service.js'
import { JobsService } from '../jobs/jobs.service.js'
import type { Tx } from '../platform/database/tx.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { FileStore } from '../platform/storage/file-store.service.js'
import { PacketDraftService } from './packet-draft.service.js'
import { PacketRendererService } from './packet-renderer.service.js'
import { Packet } from './packet.entity.js'
import type { RenderPacketPayload } from './render-packet-task.js'
import { revisionNumber } from './revision-number.js'

/**
 * Makes one packet. It may be run again at any moment and by any number of servers: a packet that is ready is left
 * alone, and of two that finish together only the first is kept.
 */
@Injectable()
export class RenderPacketService {
  constructor(
    private readonly work: UnitOfWork,
    private readonly drafts: PacketDraftService,
    private readonly renderer: PacketRendererService,
    private readonly files: FileStore,
    private readonly access: JobAccessService,
    private readonly jobs: JobsService,
    private readonly events: EventLog,
  ) {}

  async make({ districtId, packetId }: RenderPacketPayload): Promise<void> {
    const scope = { districtId, personId: null }
    const document = await this.work.run(scope, (tx) => this.drafts.prepare(tx, packetId))
    if (document === null) return
    // Drawing takes long enough that no row may be held meanwhile.
    const bytes = await this.renderer.render(document)
    await this.work.run(scope, (tx) => this.keep(tx, packetId, bytes))
  }

  /** After the last try the packet says so, and the planner makes it anew. */
  async giveUp({ districtId, packetId }: RenderPacketPayload, error: unknown): Promise<void> {
    await this.work.run({ districtId, personId: null }, async (tx) => {
      const packet = await this.hold(tx, packetId)
      if (packet.status === 'ready') return
      const failure = error instanceof Error ? error.message : String(error)
      await this.change(tx, packet, { status: 'failed', failure })
      await this.tell(tx, packet, 'packet-failed', {})
    })
  }

  private async keep(tx: Tx, packetId: string, bytes: Uint8Array): Promise<void> {
    const packet = await this.hold(tx, packetId)
    if (packet.status === 'ready') return
    const file = await this.files.store(tx, { bytes: Buffer.from(bytes), contentType: 'application/pdf' })
    const { sha256, sizeBytes } = file
    await this.change(tx, packet, {
      status: 'ready',
      fileId: file.id,
      sha256,
      sizeBytes,
      failure: null,
      readyAt: tx.at,
    })
    await this.tell(tx, packet, 'packet-ready', { sha256 })
  }

  /** The job first, then the packet: the order in which acts hold them, so that nobody waits for each other. */
  private async hold(tx: Tx, packetId: string): Promise<Packet> {
    const where = { districtId: tx.districtId, id: packetId }
    const { jobId } = await tx.manager.findOneByOrFail(Packet, where)
    await this.access.load(tx, jobId, 'to-change')
    return tx.manager.findOneOrFail(Packet, { where, lock: { mode: 'pessimistic_write' } })
  }

  private async change(tx: Tx, { id, jobId }: Packet, change: Partial<Packet>): Promise<void> {
    await tx.manager.update(Packet, { districtId: tx.districtId, id }, change)
    await this.jobs.change(tx, await this.access.load(tx, jobId, 'to-change'), {})
  }

  private async tell(tx: Tx, packet: Packet, kind: string, more: Record<string, string>): Promise<void> {
    const facts = {
      packetId: packet.id,
      kind: packet.kind,
      revision: await revisionNumber(tx, packet),
      ...more,
    }
    await this.events.append(tx, { streamId: packet.jobId, kind, facts })
  }
}
