import { refuseCsv } from './refuse-csv.js'

export interface CsvColumnsInput<Column extends string> {
  header: readonly string[]
  /** What the file should hold, for the sentence. */
  content: string
  /** In the order in which the sentence names them. */
  wanted: readonly Column[]
  needed: readonly Column[]
  /** By the letters of the title alone. Columns that are worked out from others are left unread. */
  spellings: { readonly [letters: string]: Column | 'unread' | undefined }
}

/**
 * Position of every column by its meaning. A title that nobody knows is refused, so that a misspelt column is not lost
 * without a word.
 */
export function csvColumns<Column extends string>(input: CsvColumnsInput<Column>): Map<Column, number> {
  const { header, content, wanted, needed, spellings } = input
  const refuse = (sentence: string): never =>
    refuseCsv(`The first row of the file must name the columns ${wanted.join(', ')}: ${sentence}.`)
  const columns = new Map<Column, number>()
  for (const [index, title] of header.entries()) {
    if (title.trim() === '') continue
    const meaning = spellings[title.toLowerCase().replace(/[^a-z]/g, '')]
    if (meaning === undefined) return refuse(`"${title.trim()}" is not a column of ${content}`)
    if (meaning === 'unread') continue
    if (columns.has(meaning)) return refuse(`the column ${meaning} stands there twice`)
    columns.set(meaning, index)
  }
  const missing = needed.filter((name) => !columns.has(name))
  if (missing.length > 0) return refuse(`the column ${missing.join(' and ')} is missing`)
  return columns
}
