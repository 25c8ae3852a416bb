import type { JobAction } from 'shared'
import type { EventFacts } from '../platform/events/event-facts.js'

/** What a sentence may use: names were looked up when the timeline was read. */
export interface EventWords {
  who: string
  /** Name of the design that the facts point to. */
  design: string
  facts: EventFacts
}

type Sentence = (words: EventWords) => string

const revision = ({ facts }: EventWords): string => `revision ${String(facts['revision'] ?? '')}`.trim()

const counted = (count: unknown, one: string, many: string): string =>
  count === 1 ? `1 ${one}` : `${typeof count === 'number' ? count : 0} ${many}`

/** Each kind of letter in a few words; whom it went to stands in the list of mail. */
const letterWords: Readonly<Record<string, string>> = {
  'entry-link': 'The link to the packet',
  'entry-code': 'A code for the mailed link',
  returned: 'The notice that the job is returned',
  signed: 'The notice that the packet is signed',
  approved: 'The notice that the packet is approved',
  packet: 'The approved packet',
}

const letterIn = ({ facts }: EventWords): string => letterWords[String(facts['mailKind'])] ?? 'A message'

/** An act of the workflow is recorded under its own name, so that edge and event cannot drift apart. */
const actSentences: Record<JobAction, Sentence> = {
  'send-to-landowner': (e) => `${e.who} sent ${revision(e)} to the landowner.`,
  sign: (e) => `${e.who} signed ${revision(e)}.`,
  'ask-for-changes': (e) => `${e.who} asked for a change of ${revision(e)}.`,
  'take-signature-back': (e) => `${e.who} took the signature of ${revision(e)} back.`,
  approve: (e) => `${e.who} approved ${revision(e)}.`,
  return: (e) => `${e.who} returned ${revision(e)} with ${counted(e.facts['notes'], 'note', 'notes')}.`,
  send: (e) => `${e.who} sent the packet of ${revision(e)}.`,
  'start-building': (e) => `${e.who} recorded the start of building.`,
  'finish-check-out': (e) => `${e.who} finished the check-out.`,
  certify: (e) => `${e.who} certified what was built.`,
  'return-to-building': (e) => `${e.who} returned the job to building.`,
  'record-final-payment': (e) => `${e.who} recorded the final payment.`,
  'put-in-service': (e) => `${e.who} put the ramp in service.`,
  end: (e) => `${e.who} ended the job.`,
  stop: (e) => `${e.who} stopped the job.`,
  withdraw: (e) => `${e.who} withdrew the job.`,
}

const otherSentences = {
  'job-created': (e) => `${e.who} opened the job.`,
  'producer-changed': (e) =>
    e.facts['signerChanged'] === true
      ? `${e.who} changed a producer of this job, and with the address who signs.`
      : `${e.who} changed a producer of this job.`,
  'survey-saved': (e) => `${e.who} saved the survey.`,
  'design-created': (e) => `${e.who} began the design "${e.design}".`,
  'design-saved': (e) => `${e.who} saved the design "${e.design}".`,
  'design-chosen': (e) => `${e.who} chose the design "${e.design}".`,
  'revision-frozen': (e) => `${e.who} froze the design "${e.design}" as ${revision(e)}.`,
  'packet-asked': (e) =>
    e.facts['kind'] === 'B'
      ? `The approved packet of ${revision(e)} was begun.`
      : `${e.who} asked for the packet of ${revision(e)}.`,
  'packet-ready': (e) => `Packet ${String(e.facts['kind'] ?? 'A')} of ${revision(e)} was made.`,
  'packet-failed': (e) => `Packet ${String(e.facts['kind'] ?? 'A')} of ${revision(e)} could not be made.`,
  'technically-checked': (e) =>
    e.facts['withinLimits'] === false
      ? `${e.who} checked ${revision(e)}, which is beyond that person's limits.`
      : `${e.who} checked ${revision(e)}.`,
  'came-by-link': (e) => `${e.who} came in by the mailed link and code.`,
  'consent-given': (e) => `${e.who} agreed to electronic records.`,
  'consent-withdrawn': (e) => `${e.who} no longer agrees to electronic records.`,
  'page-read': (e) => `${e.who} opened page ${String(e.facts['page'] ?? '')} of ${revision(e)}.`,
  'signatures-voided': (e) => `The signatures of ${revision(e)} are void.`,
  'note-written': (e) => `${e.who} wrote a note.`,
  'note-answered': (e) => `${e.who} answered a note.`,
  'note-settled': (e) => `${e.who} settled a note.`,
  'mail-again': (e) => `${e.who} put a message in the post again.`,
  'link-again': (e) => `${e.who} sent the link to the landowner again.`,
  'mail-sent': (e) => `${letterIn(e)} went out.`,
  'mail-failed': (e) => `${letterIn(e)} could not be delivered.`,
} as const satisfies Record<string, Sentence>

export const eventSentences: Readonly<Record<string, Sentence>> = { ...actSentences, ...otherSentences }

export type JobEventKind = keyof typeof actSentences | keyof typeof otherSentences

/** What a landowner sees of the timeline: what was done with the packet, and nothing of the district's own work. */
const shownToLandowner: ReadonlySet<string> = new Set<JobEventKind>([
  'job-created',
  'send-to-landowner',
  'came-by-link',
  'consent-given',
  'consent-withdrawn',
  'sign',
  'ask-for-changes',
  'take-signature-back',
  'signatures-voided',
  'approve',
  'return',
  'send',
  'start-building',
  'finish-check-out',
  'certify',
  'record-final-payment',
  'put-in-service',
  'end',
  'stop',
  'withdraw',
])

export const landownerSees = (kind: string): boolean => shownToLandowner.has(kind)

/** A kind this server does not know was written by a newer one: it is shown rather than hidden. */
export const eventSentence = (kind: string, words: EventWords): string =>
  eventSentences[kind]?.(words) ?? `${words.who} did this: ${kind.replaceAll('-', ' ')}.`
