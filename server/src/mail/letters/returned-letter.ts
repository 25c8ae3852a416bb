import type { JobInLetter, Letter } from './letter.js'

export interface ReturnedFacts extends JobInLetter {
  readonly returnedBy: 'landowner' | 'supervisor'
  readonly words: readonly string[]
}

const returner = { landowner: 'The landowner', supervisor: 'The supervisor' } as const

export function returnedLetter(facts: ReturnedFacts, origin: string): Letter {
  return {
    subject: `Job ${facts.number} came back to you`,
    paragraphs: [
      `${returner[facts.returnedBy]} returned job ${facts.number}, "${facts.title}".`,
      ...facts.words.map((words) => `What was said:\n${words}`),
      `Open the job: ${origin}/jobs/${facts.jobId}/notes`,
    ],
  }
}
