import type { JobInLetter, Letter } from './letter.js'

export interface RevisionFacts extends JobInLetter {
  readonly revision: number
}

export function signedLetter(facts: RevisionFacts, origin: string): Letter {
  return {
    subject: `Job ${facts.number} is signed and waits for your decision`,
    paragraphs: [
      `Every signer has signed revision ${facts.revision} of job ${facts.number}, "${facts.title}".`,
      `Read it, then approve it or return it with notes: ${origin}/jobs/${facts.jobId}/review`,
    ],
  }
}
