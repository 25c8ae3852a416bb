import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import { IsNull } from 'typeorm'
import type { Tx } from '../platform/database/tx.js'
import { Consent } from './consent.entity.js'

interface ConsentToRecord {
  personId: string
  packetId: string
  consentVersion: string
}

/** Agreement to electronic records. It stands for the person, not for one packet, until it is withdrawn. */
@Injectable()
export class ConsentsService {
  /** @returns whether anything new was recorded; agreeing twice is no second agreement. */
  async agree(tx: Tx, { personId, packetId, consentVersion }: ConsentToRecord): Promise<boolean> {
    const standing = await this.standing(tx, personId)
    if (standing?.consentVersion === consentVersion) return false
    await tx.manager.insert(Consent, {
      districtId: tx.districtId,
      id: randomUUID(),
      personId,
      packetId,
      consentVersion,
      agreedAt: tx.at,
      withdrawnAt: null,
    })
    return true
  }

  /** The newest agreement of a person that was not withdrawn. */
  standing(tx: Tx, personId: string): Promise<Consent | null> {
    return tx.manager.findOne(Consent, {
      where: { districtId: tx.districtId, personId, withdrawnAt: IsNull() },
      order: { agreedAt: 'DESC' },
    })
  }
}
