import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import { In, IsNull } from 'typeorm'
import { Problem } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { ConsentsService } from './consents.service.js'
import { Signature, type SignatureMethod } from './signature.entity.js'

export interface SignatureToRecord {
  jobId: string
  packetId: string
  packetSha256: string
  personId: string
  typedName: string
  /** As the server saw them, never as the signer's browser says in a body. */
  sessionId: string
  method: SignatureMethod
  remoteAddress: string
  userAgent: string
}

export interface SignaturesToVoid {
  jobId: string
  reason: string
  /** One signer only; left out: everybody. */
  personId?: string
}

@Injectable()
export class SignaturesService {
  constructor(private readonly consents: ConsentsService) {}

  async record(tx: Tx, { personId, ...given }: SignatureToRecord): Promise<Signature> {
    const consent = await this.consents.standing(tx, personId)
    if (consent === null) {
      throw new Problem('transition-not-allowed', {
        reasons: ['You have not agreed to electronic records yet.'],
      })
    }
    const signature = tx.manager.create(Signature, {
      ...given,
      districtId: tx.districtId,
      id: randomUUID(),
      personId,
      consentId: consent.id,
      signedAt: tx.at,
      voidAt: null,
      voidReason: null,
    })
    await tx.manager.insert(Signature, signature)
    return signature
  }

  /** Strikes the standing signatures of a job out, in plain sight. @returns the ids of those struck out. */
  async voidStanding(tx: Tx, { jobId, reason, personId }: SignaturesToVoid): Promise<string[]> {
    const standing = await tx.manager.findBy(Signature, {
      districtId: tx.districtId,
      jobId,
      voidAt: IsNull(),
      ...(personId === undefined ? {} : { personId }),
    })
    const ids = standing.map(({ id }) => id)
    if (ids.length > 0) {
      await tx.manager.update(
        Signature,
        { districtId: tx.districtId, id: In(ids) },
        { voidAt: tx.at, voidReason: reason },
      )
    }
    return ids
  }

  /** Every signature of a packet in the order given, void ones too. */
  ofPacket(tx: Tx, packetId: string): Promise<Signature[]> {
    return tx.manager.find(Signature, {
      where: { districtId: tx.districtId, packetId },
      order: { signedAt: 'ASC', id: 'ASC' },
    })
  }
}
