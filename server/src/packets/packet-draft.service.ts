import { Injectable } from '@nestjs/common'
import type { PacketView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { buildPacketView } from './document/build-packet-view.js'
import { packetDocumentVersion, type PacketDocument } from './document/packet-document.js'
import { withEvidence } from './document/with-evidence.js'
import { Packet } from './packet.entity.js'
import { PacketEvidenceService } from './source/packet-evidence.service.js'
import { PacketSourceService } from './source/packet-source.service.js'

/** Writes a packet down with every string and number in its place, once. What is drawn later is drawn from this. */
@Injectable()
export class PacketDraftService {
  constructor(
    private readonly sources: PacketSourceService,
    private readonly evidence: PacketEvidenceService,
  ) {}

  /** @returns the stored document of a packet that still has to be made, or null when it is made already. */
  async prepare(tx: Tx, packetId: string): Promise<PacketDocument | null> {
    const packet = await tx.manager.findOneOrFail(Packet, {
      where: { districtId: tx.districtId, id: packetId },
      lock: { mode: 'pessimistic_write' },
    })
    if (packet.status === 'ready') return null
    const document = (await storedDocument(tx, { id: packetId })) ?? (await this.write(tx, packet))
    const change = {
      status: 'making' as const,
      view: document,
      viewVersion: packetDocumentVersion,
      pages: pagesOf(document),
    }
    await tx.manager.update(Packet, { districtId: tx.districtId, id: packetId }, change)
    return document
  }

  private async write(tx: Tx, packet: Packet): Promise<PacketDocument> {
    if (packet.kind === 'A') return buildPacketView(await this.sources.gather(tx, packet))
    const { revisionId } = packet
    const packetA = await tx.manager.findOneByOrFail(Packet, {
      districtId: tx.districtId,
      revisionId,
      kind: 'A',
    })
    const document = await storedDocument(tx, packetA)
    if (document === null) throw new Error(`Packet A of packet ${packet.id} was never written down.`)
    return withEvidence(document, await this.evidence.gather(tx, packetA))
  }
}

async function storedDocument(tx: Tx, { id }: Pick<Packet, 'id'>): Promise<PacketDocument | null> {
  const where = { districtId: tx.districtId, id }
  const { view } = await tx.manager.findOneOrFail(Packet, {
    select: { districtId: true, id: true, view: true },
    where,
  })
  return view
}

const pagesOf = ({ pages }: PacketDocument): PacketView['pages'] =>
  pages.map(({ title, text }, index) => ({ number: index + 1, title, text }))
