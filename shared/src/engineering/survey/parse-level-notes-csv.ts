import { csvTable } from '../../csv/csv-table.js'
import { refuseCsv } from '../../csv/refuse-csv.js'
import { parseStation } from '../../format/parse-station.js'
import { mostLevelNoteRows } from '../../schemas/level-notes.js'
import { type LevelNotesColumn, levelNotesColumns } from './level-notes-columns.js'
import type { LevelRow } from './reduce-level-notes.js'

/** Each digit can be read in one way only: a cell of a million digits must not be tried in as many ways. */
const NUMBER = /^[+-]?(\d+(\.\d*)?|\.\d+)$/
const MOST_SENTENCES = 10

interface Figure {
  column: LevelNotesColumn
  key: 'stationFt' | 'backsightFt' | 'intermediateFt' | 'foresightFt' | 'waterDepthFt'
  read: (text: string) => number | undefined
  example: string
}

const readNumber = (text: string): number | undefined => (NUMBER.test(text) ? Number(text) : undefined)

const FIGURES: readonly Figure[] = [
  { column: 'station', key: 'stationFt', read: parseStation, example: '0+42 or 42' },
  { column: 'bs', key: 'backsightFt', read: readNumber, example: '4.86' },
  { column: 'is', key: 'intermediateFt', read: readNumber, example: '5.86' },
  { column: 'fs', key: 'foresightFt', read: readNumber, example: '9.46' },
  { column: 'water_depth', key: 'waterDepthFt', read: readNumber, example: '3.5' },
]

/**
 * Rows of a field book from a CSV file (comma, semicolon or tab). First row: label, station, bs, is, fs, water_depth
 * in any order and in their usual spellings; stations as 0+42 or 42. Empty lines are passed over.
 *
 * @param input.text content of the file; readings in ft with a decimal point.
 * @returns rows for reduceLevelNotes, which checks the sights themselves.
 * @throws EngineeringInputError naming `text`, with one sentence for each bad figure (file row and column).
 * @see common practice, no source.
 * @example parseLevelNotesCsv({ text: 'label,station,bs,is,fs\nBM,,4.86,,\n0+20,0+20,,6.46,' })
 */
export function parseLevelNotesCsv({ text }: { text: string }): LevelRow[] {
  const { rows, errors } = readLevelNotesCsv({ text })
  return errors.length > 0 ? refuse(errors.map(({ message }) => message)) : rows
}

export interface LevelNotesCsvError {
  /** As the file counts, the column names being row 1. */
  row: number
  column: LevelNotesColumn
  message: string
}

export interface LevelNotesCsv {
  rows: LevelRow[]
  errors: LevelNotesCsvError[]
}

/**
 * The same for a form that shows each bad figure beside its row: a figure that is no number is left out of its row and
 * named in `errors`. Throws only when the file as a whole is no table of level notes.
 */
export function readLevelNotesCsv({ text }: { text: string }): LevelNotesCsv {
  const errors: LevelNotesCsvError[] = []
  const lines = csvTable({
    text,
    content: 'level notes',
    mostRows: mostLevelNoteRows,
    columnsOf: levelNotesColumns,
  })
  const rows = lines.map(({ at, fileRow }): LevelRow => {
    const row: LevelRow = { label: at('label') || at('station') || `row ${fileRow}` }
    for (const { column, key, read, example } of FIGURES) {
      const written = at(column)
      if (written === '') continue
      const figure = read(written)
      if (figure === undefined) {
        const message = `Row ${fileRow}, column "${column}": "${written}" is not a number such as ${example}.`
        errors.push({ row: fileRow, column, message })
      } else row[key] = figure
    }
    return row
  })
  return { rows, errors }
}

function refuse(sentences: string[]): never {
  const shown = sentences.slice(0, MOST_SENTENCES)
  const left = sentences.length - shown.length
  return refuseCsv([...shown, ...(left > 0 ? [`And ${left} more.`] : [])].join(' '))
}
