import type { Letter } from './letter.js'
import type { RevisionFacts } from './signed-letter.js'

export function approvedLetter(facts: RevisionFacts, origin: string): Letter {
  return {
    subject: `Job ${facts.number} is approved and can be sent`,
    paragraphs: [
      `Revision ${facts.revision} of job ${facts.number}, "${facts.title}", is approved.`,
      `The final packet is being made. Check the address and send it: ${origin}/jobs/${facts.jobId}/send`,
    ],
  }
}
