import { paginate } from './layout/paginate.js'
import { textPageOf } from './make-page.js'
import type { PacketDocument } from './packet-document.js'
import type { PacketEvidence } from './packet-source.js'
import { evidencePage } from './pages/evidence-page.js'

/**
 * Packet B: the stored pages of packet A untouched, with what came after them. Their numbers stay as they were
 * signed, so the new pages are counted by themselves.
 */
export function withEvidence(packetA: PacketDocument, evidence: PacketEvidence): PacketDocument {
  const laid = paginate(evidencePage(evidence, packetA.frame))
  const pages = laid.map((page, index) =>
    textPageOf(page, packetA.frame, `Evidence page ${index + 1} of ${laid.length}`),
  )
  return {
    ...packetA,
    kind: 'B',
    title: `${packetA.title}, approved`,
    madeAt: evidence.approval.at,
    pages: [...packetA.pages, ...pages],
  }
}
