import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import type { Asking } from '../jobs/job-access.service.js'
import type { Tx } from '../platform/database/tx.js'
import { MakePacketService } from './make-packet.service.js'
import { PacketAccessService } from './packet-access.service.js'
import type { Packet } from './packet.entity.js'
import { revisionNumber } from './revision-number.js'

export interface ShownRevision {
  jobId: string
  revision: number
}

/** What other domains may ask of packets. */
@Injectable()
export class PacketsService {
  constructor(
    private readonly access: PacketAccessService,
    private readonly maker: MakePacketService,
  ) {}

  async revisionOf(tx: Tx, packetId: string): Promise<number> {
    return revisionNumber(tx, await this.access.load(tx, packetId))
  }

  /** Which revision a packet shows, for somebody who may read it; null for anybody else. */
  async revisionShownTo(tx: Tx, asking: Asking, packetId: string): Promise<ShownRevision | null> {
    try {
      const wanted = { permission: 'packet:read', packetId, lock: 'to-read' } as const
      const { packet } = await this.access.find(tx, asking, wanted)
      return { jobId: packet.jobId, revision: await revisionNumber(tx, packet) }
    } catch (error) {
      if (error instanceof Problem && error.slug === 'not-found') return null
      throw error
    }
  }

  /** Opens packet B of the revision that packet A shows. */
  async makeFinal(tx: Tx, packetAId: string): Promise<Packet> {
    const packetA = await this.access.load(tx, packetAId)
    return this.maker.makeFinal(tx, packetA, await revisionNumber(tx, packetA))
  }

  async fileIdOf(tx: Tx, packetId: string): Promise<string> {
    const { fileId } = await this.access.load(tx, packetId)
    if (fileId === null) throw new Error(`Packet ${packetId} has no file yet.`)
    return fileId
  }
}
