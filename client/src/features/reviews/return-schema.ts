import { paragraph } from 'shared'
import { z } from 'zod'

/** Leaves room for the page that goes before each note of an act. */
const MOST = 1980

/** Notes as they are written: each may name its page. */
export const returnSchema = (pages: number) => {
  const words = `Give a page from 1 to ${pages}`
  return z.object({
    notes: z
      .array(
        z.object({
          text: paragraph(MOST),
          page: z.number(words).int(words).min(1, words).max(pages, words).optional(),
        }),
      )
      .min(1, 'Write at least one note')
      .max(50, 'Write at most 50 notes'),
  })
}

export type ReturnDraft = z.infer<ReturnType<typeof returnSchema>>

/** The act carries plain notes, so the page goes into the words. */
export const noteWords = ({ text, page }: ReturnDraft['notes'][number]): string =>
  page === undefined ? text : `Page ${page}: ${text}`
