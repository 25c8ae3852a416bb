import { civilDateText, formatInstant } from 'shared'
import type { Block, PageDraft } from '../layout/block.js'
import type { PageFrame } from '../packet-document.js'
import type { PacketEvidence, PacketSignature, SignatureMethod } from '../packet-source.js'

const methodWords: { readonly [method in SignatureMethod]: string } = {
  'mailed-link-and-code': 'by a mailed link and a mailed code',
  password: 'signed in with a password',
  'at-the-table': 'on the planner’s tablet, with the planner present',
  'on-paper': 'by hand on paper; the scan is on record',
}

/** Who signed what, when and how, and where the record of it is anchored. */
export function evidencePage(evidence: PacketEvidence, frame: PageFrame): PageDraft {
  const { technicalCheck, approval, eventChain } = evidence
  const both = (at: string) => `${formatInstant(at, frame.timeZone)}\n${at} (UTC)`
  const check = technicalCheck
    ? [
        { name: 'By', value: technicalCheck.by },
        { name: 'At', value: both(technicalCheck.at) },
        {
          name: 'Limits',
          value: technicalCheck.withinLimits
            ? 'within the limits of the person who checked'
            : 'beyond the limits of the person who checked',
        },
        ...(technicalCheck.note ? [{ name: 'Note', value: technicalCheck.note }] : []),
      ]
    : [{ name: 'By', value: 'no technical check is on record' }]
  const meeting = [
    ...(approval.meetingDate ? [{ name: 'Meeting', value: civilDateText(approval.meetingDate) }] : []),
    ...(approval.agendaItem ? [{ name: 'Agenda item', value: approval.agendaItem }] : []),
  ]
  return {
    title: 'Signatures and evidence',
    blocks: [
      {
        kind: 'paragraph',
        text: `The pages before this one are those that were signed: packet A of job ${frame.jobNumber}, revision ${frame.revision}. Its file has this SHA-256:`,
      },
      { kind: 'paragraph', text: evidence.packetASha256, weight: 'bold' },
      ...evidence.signatures.flatMap((signature) => signatureBlocks(signature, both)),
      { kind: 'heading', text: 'Technical check' },
      { kind: 'facts', facts: check },
      { kind: 'heading', text: 'Approval for the district' },
      {
        kind: 'facts',
        facts: [{ name: 'By', value: approval.name }, { name: 'At', value: both(approval.at) }, ...meeting],
      },
      { kind: 'heading', text: 'Record of events' },
      {
        kind: 'facts',
        facts: [
          { name: 'Last event', value: `number ${eventChain.sequence}` },
          { name: 'Its hash', value: eventChain.rowHash },
        ],
      },
      {
        kind: 'paragraph',
        size: 'small',
        tone: 'mute',
        text: 'Every event of the job carries the hash of the one before it. If one is changed, the hash above no longer follows from the record.',
      },
    ],
  }
}

function signatureBlocks(signature: PacketSignature, both: (at: string) => string): Block[] {
  return [
    { kind: 'heading', text: `Signed by ${signature.name}` },
    {
      kind: 'facts',
      facts: [
        { name: 'Typed name', value: signature.typedName },
        { name: 'At', value: both(signature.signedAt) },
        { name: 'How', value: methodWords[signature.method] },
        { name: 'Consent text', value: `version ${signature.consentVersion}` },
        { name: 'Address, program', value: [signature.ip, signature.userAgent].filter(Boolean).join(', ') },
      ],
    },
  ]
}
