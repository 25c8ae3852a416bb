import { Injectable } from '@nestjs/common'
import { createHash, randomUUID } from 'node:crypto'
import { Problem } from 'shared'
import type { Tx } from '../database/tx.js'
import { StoredFile } from './file.entity.js'

export interface FileToStore {
  bytes: Buffer
  contentType: string
}

export interface FileBytes extends FileToStore {
  sha256: string
}

/** Keeps bytes under their hash. A stored file is never written again. */
@Injectable()
export class FileStore {
  async store(tx: Tx, { bytes, contentType }: FileToStore): Promise<Omit<StoredFile, 'bytes'>> {
    const file = {
      districtId: tx.districtId,
      id: randomUUID(),
      sha256: createHash('sha256').update(bytes).digest('hex'),
      contentType,
      sizeBytes: bytes.length,
      createdBy: tx.personId,
      createdAt: tx.at,
    }
    await tx.manager.insert(StoredFile, { ...file, bytes })
    return file
  }

  /** @throws Problem not-found when there is no such file in this district. */
  async read(tx: Tx, id: string): Promise<FileBytes> {
    const file = await tx.manager.findOne(StoredFile, {
      select: { districtId: true, id: true, bytes: true, sha256: true, contentType: true },
      where: { districtId: tx.districtId, id },
    })
    if (file === null) throw new Problem('not-found')
    return file
  }
}
