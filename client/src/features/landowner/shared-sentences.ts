import { useTranslation } from 'react-i18next'

interface SharedSentence {
  says: RegExp
  key: string
}

/**
 * Rules and schemas of shared speak English. A landowner reads them in the language of the page; what is not listed
 * here is shown as it came.
 */
export const sharedSentences: readonly SharedSentence[] = [
  { says: /^You are not a signer of this job\.$/, key: 'reasons.notSigner' },
  { says: /^You designed or checked this packet, so you cannot sign it\.$/, key: 'reasons.judgedIt' },
  { says: /^You have signed this revision already\.$/, key: 'reasons.signedAlready' },
  { says: /^You have not signed this revision\.$/, key: 'reasons.notSigned' },
  { says: /^You have not agreed to electronic records yet\.$/, key: 'reasons.consentMissing' },
  { says: /^You have not opened every page yet\.$/, key: 'reasons.readMissing' },
  { says: /^This is not the packet that is in force now\./, key: 'reasons.otherPacket' },
  { says: /^Say in a note what should change\.$/, key: 'reasons.noteMissing' },
  { says: /^Give a reason\.$/, key: 'reasons.reasonMissing' },
  { says: /^This must not be empty$/, key: 'reasons.empty' },
  { says: /^Use at most (?<most>\d+) characters$/, key: 'reasons.tooLong' },
  { says: /^Control characters are not allowed$/, key: 'reasons.controls' },
  { says: /^Tick that you mean this as your signature$/, key: 'sign.must' },
  { says: /^Tick the box to agree, or ask for paper$/, key: 'consent.must' },
]

/** The catalogue key of a sentence of shared, or null when it has none. */
export const sentenceKey = (sentence: string): string | null =>
  sharedSentences.find(({ says }) => says.test(sentence))?.key ?? null

/** Says a sentence of shared in the language of the page. */
export function useSharedWords(): (sentence: string) => string {
  const { t } = useTranslation()
  return (sentence) => {
    const known = sharedSentences.find(({ says }) => says.test(sentence))
    return known ? t(known.key, { ...known.says.exec(sentence)?.groups }) : sentence
  }
}
