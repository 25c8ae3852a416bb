import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { LessThan } from 'typeorm'
import { UnitOfWork } from '../database/unit-of-work.js'
import type { Tx } from '../database/tx.js'
import { IdempotencyKey } from './idempotency-key.entity.js'
import type { Intention } from './intended.decorator.js'

const keptMs = 30 * 86_400_000

interface Person {
  personId: string
  districtId: string
}

/** Does a thing once. The key, what was done and the answer are written together or not at all. */
@Injectable()
export class OnceService {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  /** @throws Problem idempotency-key-reused when the key came with another request before. */
  run<Answer>(person: Person, intention: Intention, work: (tx: Tx) => Promise<Answer>): Promise<Answer> {
    return this.unitOfWork.run(person, async (tx) => {
      if (!(await this.claim(tx, person, intention))) return this.answerOf<Answer>(tx, person, intention)
      const answer = await work(tx)
      await tx.manager.update(IdempotencyKey, keyOf(person, intention), { answer: { given: answer } })
      await tx.manager.delete(IdempotencyKey, {
        districtId: person.districtId,
        personId: person.personId,
        createdAt: LessThan(new Date(tx.at.getTime() - keptMs)),
      })
      return answer
    })
  }

  /** A second request with the same key waits here until the first is committed or undone. */
  private async claim(tx: Tx, person: Person, intention: Intention): Promise<boolean> {
    const inserted = await tx.manager
      .createQueryBuilder()
      .insert()
      .into(IdempotencyKey)
      .values({ ...keyOf(person, intention), fingerprint: intention.fingerprint, createdAt: tx.at })
      .orIgnore()
      .returning('key')
      .execute()
    return Array.isArray(inserted.raw) && inserted.raw.length > 0
  }

  private async answerOf<Answer>(tx: Tx, person: Person, intention: Intention): Promise<Answer> {
    const kept = await tx.manager.findOneByOrFail(IdempotencyKey, keyOf(person, intention))
    if (kept.fingerprint !== intention.fingerprint) throw new Problem('idempotency-key-reused')
    return (kept.answer as { given: Answer }).given
  }
}

const keyOf = ({ districtId, personId }: Person, { key }: Intention) => ({ districtId, personId, key })
