import { Injectable } from '@nestjs/common'
import type { Tx } from '../database/tx.js'
import type { EventFacts } from './event-facts.js'
import { EventRow } from './event.entity.js'
import { noPreviousHash, rowHash } from './row-hash.js'

export interface NewEvent {
  /** The job, or the district itself for what concerns no job. */
  streamId: string
  kind: string
  facts: EventFacts
}

export interface EventHead {
  sequence: number
  rowHash: string
}

export type ChainVerdict = { isIntact: true; head: EventHead | null } | { isIntact: false; brokenAt: number }

/** The append-only record of what happened. */
@Injectable()
export class EventLog {
  async append(tx: Tx, { streamId, kind, facts }: NewEvent): Promise<EventRow> {
    // One writer at a time for each stream, so that no two events follow the same one.
    await tx.manager.query('select pg_advisory_xact_lock(hashtextextended($1, 0))', [streamId])
    const head = await this.head(tx, streamId)
    const row = {
      districtId: tx.districtId,
      streamId,
      sequence: (head?.sequence ?? 0) + 1,
      kind,
      actorId: tx.personId,
      at: tx.at,
      facts,
      previousHash: head?.rowHash ?? noPreviousHash,
    }
    const event: EventRow = { ...row, rowHash: rowHash(row) }
    await tx.manager.insert(EventRow, event)
    return event
  }

  /** The newest event of a stream; null when nothing happened yet. */
  async head(tx: Tx, streamId: string): Promise<EventHead | null> {
    return tx.manager.findOne(EventRow, {
      select: { districtId: true, streamId: true, sequence: true, rowHash: true },
      where: { districtId: tx.districtId, streamId },
      order: { sequence: 'DESC' },
    })
  }

  read(tx: Tx, streamId: string): Promise<EventRow[]> {
    return tx.manager.find(EventRow, {
      where: { districtId: tx.districtId, streamId },
      order: { sequence: 'ASC' },
    })
  }

  /** Works the whole chain out anew. A changed, missing or added row breaks it at its sequence. */
  async verify(tx: Tx, streamId: string): Promise<ChainVerdict> {
    let head: EventHead | null = null
    for (const event of await this.read(tx, streamId)) {
      const expected = (head?.sequence ?? 0) + 1
      const follows = event.sequence === expected && event.previousHash === (head?.rowHash ?? noPreviousHash)
      if (!follows || event.rowHash !== rowHash(event)) return { isIntact: false, brokenAt: expected }
      head = { sequence: event.sequence, rowHash: event.rowHash }
    }
    return { isIntact: true, head }
  }
}
