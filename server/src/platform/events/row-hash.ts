import { createHash } from 'node:crypto'
import { canonicalJson } from './canonical-json.js'
import type { EventRow } from './event.entity.js'

/** What the first event of a stream follows. */
export const noPreviousHash = '0'.repeat(64)

/** The seal of an event: it covers the row and, by the hash before it, every earlier one. */
export function rowHash(row: Omit<EventRow, 'rowHash'>): string {
  const { districtId, streamId, sequence, kind, actorId, at, facts, previousHash } = row
  const sealed = { districtId, streamId, sequence, kind, actorId, at: at.toISOString(), facts, previousHash }
  return createHash('sha256').update(canonicalJson(sealed)).digest('hex')
}
