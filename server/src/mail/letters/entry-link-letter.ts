import type { JobInLetter, Letter } from './letter.js'

export interface EntryLinkFacts extends JobInLetter {
  readonly recipientName: string
  readonly token: string
  readonly daysValid: number
}

/**
 * The landowner's way in. The secret stands in this text and nowhere else, and behind a number sign, so that no
 * server on the way ever gets it in a request.
 */
export function entryLinkLetter(facts: EntryLinkFacts, origin: string): Letter {
  return {
    subject: `Your watering ramp plan ${facts.number} is ready to read`,
    paragraphs: [
      `Dear ${facts.recipientName},`,
      `The plan "${facts.title}" is ready for you. Please read it, then sign it or ask for a change.`,
      `Open this link:\n${origin}/enter#t=${facts.token}`,
      `Wadestone then mails you a code of six digits, so that nobody else can read your plan. The link is good for ${facts.daysValid} days.`,
      'You may have everything on paper instead. Just call or write to the district office.',
      'Please do not start work before the plan is approved in writing. Work begun early may not be paid.',
    ],
  }
}
