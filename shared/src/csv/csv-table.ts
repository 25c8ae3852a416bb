import Papa from 'papaparse'
import { numberText } from '../format/number-text.js'
import { refuseCsv } from './refuse-csv.js'

export interface CsvLine<Column extends string> {
  /** As the file counts, the column names being row 1. */
  fileRow: number
  /** The trimmed cell, empty where the row or the file has none. */
  at: (column: Column) => string
}

export interface CsvTableInput<Column extends string> {
  text: string
  /** What the file should hold, for the sentence. */
  content: string
  mostRows: number
  columnsOf: (header: readonly string[]) => Map<Column, number>
}

/**
 * The rows under the column names of a CSV file (comma, semicolon or tab). Empty rows are passed over.
 *
 * @throws EngineeringInputError naming `text` when the file as a whole is no such table or has more than `mostRows` rows.
 */
export function csvTable<Column extends string>(input: CsvTableInput<Column>): CsvLine<Column>[] {
  const [header, ...rows] = filledRows(input)
  if (header === undefined) return refuseCsv('The file is empty.')
  const columns = input.columnsOf(header.values)
  if (rows.length === 0) return refuseCsv('The file has column names but no rows under them.')
  if (rows.length > input.mostRows) return refuseCsv(tooLong(rows.length, input.mostRows))
  return rows.map(({ values, fileRow }) => ({
    fileRow,
    at: (column) => values[columns.get(column) ?? -1]?.trim() ?? '',
  }))
}

const tooLong = (rows: number, most: number): string =>
  `The file has ${numberText(rows)} rows under its column names; at most ${numberText(most)} can be read. Leave out the rows that are not needed.`

function filledRows({ text, content }: { text: string; content: string }) {
  if (typeof text !== 'string' || text.includes('\0')) {
    return refuseCsv(`This is not a text file. Save the ${content} as CSV and choose that file.`)
  }
  const { data, errors } = Papa.parse<string[]>(text.replace(/^\uFEFF/, ''), { delimiter: delimiterOf(text) })
  const quoting = errors.find(({ type }) => type === 'Quotes')
  if (quoting) return refuseCsv(`Row ${(quoting.row ?? 0) + 1} has a quotation mark that is not closed.`)
  return data
    .map((values, index) => ({ values, fileRow: index + 1 }))
    .filter(({ values }) => values.some((value) => value.trim() !== ''))
}

/** The header decides; guessing over the whole file is led astray by commas in remarks. */
function delimiterOf(text: string): string {
  const header = text.trimStart().split(/\r\n|\r|\n/, 1)[0] ?? ''
  return [';', '\t'].find((mark) => header.includes(mark)) ?? ','
}
