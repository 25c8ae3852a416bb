/** What one message says. Plain words, no markup. */
export interface Letter {
  readonly subject: string
  readonly paragraphs: readonly string[]
}

/** What every letter about a job can tell. */
export interface JobInLetter {
  readonly jobId: string
  readonly number: string
  readonly title: string
}

/** Paragraphs, then who writes, so that the reader knows whom to call. */
export function letterText({ paragraphs }: Letter, districtName: string): string {
  return [...paragraphs, districtName, 'This message was sent by Wadestone for the district.'].join('\n\n')
}
