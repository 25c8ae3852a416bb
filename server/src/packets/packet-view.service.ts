import { Injectable } from '@nestjs/common'
import type { PacketView } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { packetViewQuery, type PacketViewRow } from './packet-view-query.js'
import type { Packet } from './packet.entity.js'

@Injectable()
export class PacketViewService {
  /** A packet as the person of this transaction sees it. */
  async viewOf(tx: Tx, packet: Packet): Promise<PacketView> {
    const parameters = [tx.districtId, packet.id, tx.personId]
    const [row]: PacketViewRow[] = await tx.manager.query(packetViewQuery, parameters)
    if (row === undefined) throw new Error(`Packet ${packet.id} went away while it was read.`)
    return {
      id: packet.id,
      jobId: packet.jobId,
      kind: packet.kind,
      revision: row.revision,
      status: packet.status,
      sha256: packet.sha256,
      sizeBytes: packet.sizeBytes,
      pages: packet.pages ?? [],
      pagesReadByMe: row.pagesReadByMe,
      iHaveConsented: row.iHaveConsented,
      technicalCheck: row.technicalCheck,
      signatures: row.signatures,
    }
  }
}
