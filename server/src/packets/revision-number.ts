import { Revision } from '../designs/revision.entity.js'
import type { Tx } from '../platform/database/tx.js'
import type { Packet } from './packet.entity.js'

/** Which revision of the job a packet shows. */
export async function revisionNumber(tx: Tx, { revisionId }: Pick<Packet, 'revisionId'>): Promise<number> {
  const where = { districtId: tx.districtId, id: revisionId }
  const { number } = await tx.manager.findOneOrFail(Revision, {
    select: { districtId: true, id: true, number: true },
    where,
  })
  return number
}
