import type { Letter } from './letter.js'

export interface EntryCodeFacts {
  readonly code: string
  readonly minutesValid: number
}

export function entryCodeLetter({ code, minutesValid }: EntryCodeFacts): Letter {
  return {
    subject: 'Your code for Wadestone',
    paragraphs: [
      `Your code is ${code}`,
      `Type it on the page you opened. It is good for ${minutesValid} minutes and for one use.`,
      'If you did not ask for a code, you need do nothing. Nobody from the district will ask you for it.',
    ],
  }
}
