import { createHash, randomBytes, randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { IsNull } from 'typeorm'
import type { AccountsTx, Tx } from '../platform/database/tx.js'
import { EntryLink } from './entry-link.entity.js'
import { Membership } from './membership.entity.js'
import { Person } from './person.entity.js'

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
    return usable(await tx.manager.findOneBy(EntryLink, { tokenHash: hashOf(token) }), tx.at)
  }

  /** Finds it and keeps others from it until the transaction ends: codes are made and tried one by one. */
  async hold(tx: AccountsTx, token: string): Promise<EntryLink> {
    const where = { tokenHash: hashOf(token) }
    const link = await tx.manager.findOne(EntryLink, { where, lock: { mode: 'pessimistic_write' } })
    return usable(link, tx.at)
  }

  /** @throws Problem link-spent when the person may no longer come in. */
  async personOf(tx: AccountsTx, { personId, districtId }: EntryLink): Promise<Person> {
    const person = await tx.manager.findOneBy(Person, { id: personId, isActive: true })
    const isMember = await tx.manager.existsBy(Membership, { personId, districtId, isActive: true })
    if (person === null || !isMember) throw linkSpent()
    return person
  }
}

const linkSpent = (): Problem =>
  new Problem('link-spent', {
    detail: 'Use the link in the newest mail, or ask the district office to send another.',
  })

function usable(link: EntryLink | null, at: Date): EntryLink {
  if (link === null || link.revokedAt !== null || link.expiresAt <= at) throw linkSpent()
  return link
}
