import { Injectable } from '@nestjs/common'
import type { Tx } from '../../platform/database/tx.js'
import { EventLog } from '../../platform/events/event-log.service.js'
import type { PacketEvidence } from '../document/packet-source.js'
import type { Packet } from '../packet.entity.js'
import { packetEvidenceQuery, type PacketEvidenceRow } from './packet-evidence-query.js'

/** Gathers what packet B adds to packet A: who signed, who checked, who approved, and where the event chain stood. */
@Injectable()
export class PacketEvidenceService {
  constructor(private readonly events: EventLog) {}

  async gather(tx: Tx, packetA: Packet): Promise<PacketEvidence> {
    const rows: PacketEvidenceRow[] = await tx.manager.query(packetEvidenceQuery, [tx.districtId, packetA.id])
    const [row] = rows
    const head = await this.events.head(tx, packetA.jobId)
    if (!row?.approval || head === null || packetA.sha256 === null) {
      throw new Error(`Packet ${packetA.id} has no approval to print evidence of.`)
    }
    const { signatures, technicalCheck, approval } = row
    return {
      packetASha256: packetA.sha256,
      signatures,
      technicalCheck,
      approval,
      eventChain: head,
    }
  }
}
