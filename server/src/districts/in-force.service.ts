import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import type { EntityTarget } from 'typeorm'
import { civilDateIn } from '../platform/clock/civil-date.js'
import type { Tx } from '../platform/database/tx.js'
import { District } from './district.entity.js'
import { requireEffective, requireDraft, type VersionedRow } from './versioned-row.js'

export interface PutInForce {
  entity: EntityTarget<VersionedRow>
  /** What such a row is called in a sentence, such as "cost list". */
  noun: string
  id: string
}

/** What criteria sets, cost lists and payment schedules share: a draft comes in force and is never edited again. */
@Injectable()
export class InForceService {
  /**
   * Puts a draft in force and retires the one it takes the place of: the one of the district or, of rows with a key,
   * the one with the same key.
   *
   * @returns the id of the one retired; null when there was none.
   * @throws Problem not-found, already-in-use, or invalid-fields outside the days the row is made for.
   */
  async put(tx: Tx, { entity, noun, id }: PutInForce): Promise<string | null> {
    // The district's row is held first, so that two put in force at once come one by one.
    const onDate = await this.holdToday(tx)
    const row = await tx.manager.findOne(entity, {
      where: { districtId: tx.districtId, id },
      lock: { mode: 'pessimistic_write' },
    })
    if (row === null) throw new Problem('not-found')
    requireDraft(row, noun)
    requireEffective(row, onDate, noun)
    const retiredId = await this.retireBefore(tx, entity, row)
    const inForce = { status: 'in-force' as const, version: row.version + 1, inForceAt: tx.at }
    await tx.manager.update(entity, { districtId: tx.districtId, id }, inForce)
    return retiredId
  }

  /** @throws Problem already-in-use once the row has been in force. */
  requireDraft(row: VersionedRow, noun: string): void {
    requireDraft(row, noun)
  }

  private async retireBefore(tx: Tx, entity: EntityTarget<VersionedRow>, { key }: VersionedRow) {
    const { districtId } = tx
    const inItsPlace = key === undefined ? {} : { key }
    const before = await tx.manager.findOneBy(entity, { districtId, status: 'in-force', ...inItsPlace })
    if (before === null) return null
    const retired = { status: 'retired' as const, version: before.version + 1, retiredAt: tx.at }
    await tx.manager.update(entity, { districtId, id: before.id }, retired)
    return before.id
  }

  private async holdToday(tx: Tx): Promise<string> {
    const { timeZone } = await tx.manager.findOneOrFail(District, {
      where: { id: tx.districtId },
      lock: { mode: 'for_no_key_update' },
    })
    return civilDateIn(timeZone, tx.at)
  }
}
