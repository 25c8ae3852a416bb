import { approvedLetter } from './approved-letter.js'
import { entryCodeLetter, type EntryCodeFacts } from './entry-code-letter.js'
import { entryLinkLetter, type EntryLinkFacts } from './entry-link-letter.js'
import type { Letter } from './letter.js'
import { packetLetter, type PacketFacts } from './packet-letter.js'
import { returnedLetter, type ReturnedFacts } from './returned-letter.js'
import { signedLetter, type RevisionFacts } from './signed-letter.js'

/** What each kind of letter needs to know. */
export interface LetterFacts {
  'entry-link': EntryLinkFacts
  'entry-code': EntryCodeFacts
  returned: ReturnedFacts
  signed: RevisionFacts
  approved: RevisionFacts
  packet: PacketFacts
}

export type MailKind = keyof LetterFacts

export const letters: { [Kind in MailKind]: (facts: LetterFacts[Kind], origin: string) => Letter } = {
  'entry-link': entryLinkLetter,
  'entry-code': entryCodeLetter,
  returned: returnedLetter,
  signed: signedLetter,
  approved: approvedLetter,
  packet: packetLetter,
}

/** Whoever reads these texts gets in: they are wiped as soon as they are out. */
export const secretKinds: readonly MailKind[] = ['entry-link', 'entry-code']
