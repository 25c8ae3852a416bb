import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import type { Asking } from '../jobs/job-access.service.js'
import type { Tx } from '../platform/database/tx.js'
import { FileStore, type FileBytes } from '../platform/storage/file-store.service.js'
import { PacketAccessService } from './packet-access.service.js'
import { revisionNumber } from './revision-number.js'

export interface PacketFile extends FileBytes {
  fileName: string
}

/** The stored bytes of a packet, for somebody who may read it. */
@Injectable()
export class PacketFileService {
  constructor(
    private readonly access: PacketAccessService,
    private readonly files: FileStore,
  ) {}

  async read(tx: Tx, asking: Asking, packetId: string): Promise<PacketFile> {
    const wanted = { permission: 'packet:read', packetId, lock: 'to-read' } as const
    const { packet, job } = await this.access.find(tx, asking, wanted)
    if (packet.fileId === null) throw new Problem('not-found', { detail: 'This packet is not made yet.' })
    const file = await this.files.read(tx, packet.fileId)
    const revision = await revisionNumber(tx, packet)
    return { ...file, fileName: `${job.number}-${packet.kind}-${revision}.pdf` }
  }
}
