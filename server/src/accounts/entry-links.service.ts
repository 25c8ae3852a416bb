import { createHash, randomBytes, randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { IsNull } from 'typeorm'
import type { AccountsTx, Tx } from '../platform/database/tx.js'
import { EntryLink } from './entry-link.entity.js'

const daysValid = 14

const hashOf = (token: string): string => createHash('sha256').update(token).digest('base64url')

/** The links that are mailed to landowners. The secret itself is only ever in the mail. */
@Injectable()
export class EntryLinksService {
  /** A new link ends the earlier ones of the same person and job. */
  async make(
    tx: Tx,
    { personId, jobId }: { personId: string; jobId: string },
  ): Promise<{ token: string; daysValid: number }> {
    const { districtId, manager, at } = tx
    await manager.update(EntryLink, { districtId, personId, jobId, revokedAt: IsNull() }, { revokedAt: at })
    const token = randomBytes(32).toString('base64url')
    await manager.insert(EntryLink, {
      id: randomUUID(),
      districtId,
      personId,
      jobId,
      tokenHash: hashOf(token),
      createdAt: at,
      expiresAt: new Date(at.getTime() + daysValid * 86_400_000),
      revokedAt: null,
    })
    return { token, daysValid }
  }

  /** @throws Problem link-spent for a link that was never made, was replaced, or ran out: the same for all. */
  async find(tx: AccountsTx, token: string): Promise<EntryLink> {
    const link = await tx.manager.findOneBy(EntryLink, { tokenHash: hashOf(token) })
    if (link === null || link.revokedAt !== null || link.expiresAt <= tx.at) {
      throw new Problem('link-spent', {
        detail: 'Use the link in the newest mail, or ask the district office to send another.',
      })
    }
    return link
  }
}
