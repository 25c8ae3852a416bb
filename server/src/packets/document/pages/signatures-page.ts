import { moneyText, readyValue } from 'shared'
import type { Block, PageDraft } from '../layout/block.js'
import type { PacketSource } from '../packet-source.js'
import { signingWords } from '../texts/signing.js'

/** Empty lines: this page is signed by hand, or its signatures stand on the evidence page of the final packet. */
export function signaturesPage({ producers, job, revision, result }: PacketSource): PageDraft {
  const funding = readyValue(result.funding)
  const cost = readyValue(result.cost)
  const money =
    funding && cost
      ? `Estimated cost ${moneyText(cost.typical)}. All funds together ${moneyText(funding.totalPaid)}. Left to the landowner ${moneyText(funding.landownerShare)}.`
      : ''
  return {
    title: 'Signatures',
    blocks: [
      { kind: 'paragraph', text: `Job ${job.number}, ${job.title}, revision ${revision}.`, weight: 'bold' },
      ...(money ? [{ kind: 'paragraph' as const, text: money }] : []),
      { kind: 'paragraph', text: signingWords.landowner },
      ...producers.map(({ name }): Block => ({ kind: 'signature', role: 'Landowner', name })),
      { kind: 'signature', role: 'Technical check: figures and criteria', name: 'Name and title' },
      { kind: 'signature', role: 'Approved for the district', name: 'Name and title' },
      { kind: 'paragraph', text: signingWords.electronic, size: 'small', tone: 'mute' },
      {
        kind: 'paragraph',
        text: `A change of the design makes a new revision, and signatures of this one no longer count. Words: version ${signingWords.version}.`,
        size: 'small',
        tone: 'mute',
      },
    ],
  }
}
