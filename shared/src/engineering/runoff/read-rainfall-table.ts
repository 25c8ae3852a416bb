import Papa from 'papaparse'
import { rainfallHeader } from './rainfall-header.js'
import { rainfallRow, type RainfallRow } from './rainfall-row.js'
import type { RainfallTable, ReadRainfallTableInput } from './rainfall-table.js'
import { refuseText } from './refuse-text.js'

const MOST_CHARACTERS = 200_000
const MM_PER_IN = 25.4

/**
 * Point-precipitation frequency table from its CSV text. Row and column are found by their labels, never by place.
 * A file that repeats the table for its upper and lower bounds starts with the estimates; only those are read.
 *
 * @returns depths in inches by duration and return period, with volume, series, place and date of the file.
 * @throws EngineeringInputError naming text, with one sentence, for a wrong kind of file: no table, intensities,
 * another series than the one asked for, a bound instead of the estimate, a damaged row.
 * Source: layout of NOAA Atlas 14 point precipitation files, Precipitation Frequency Data Server.
 * @example readRainfallTable({ text }).returnPeriodsYr // [1, 2, 5, 10, 25, 50, 100, 200, 500, 1000]
 */
export function readRainfallTable(input: ReadRainfallTableInput): RainfallTable {
  const rows = cellsOf(input.text)
  const top = rows.findIndex((cells) => /^by duration for (ARI|AEP)\b/i.test(cells[0]?.trim() ?? ''))
  if (top < 0) refuseNoTable(input.text)
  const above = rows.slice(0, top).map((cells) => cells.join(','))
  const title = above.findLast((line) => line.trim() !== '') ?? ''
  if (/upper|lower|bound|confidence/i.test(title)) {
    refuseText('This file holds a confidence bound; give the file of the estimates.')
  }
  const header = rainfallHeader(above)
  if (header.series !== (input.series ?? 'partial-duration')) {
    refuseText(
      `This file holds the ${header.series} series; give the file of the ${input.series ?? 'partial-duration'} series.`,
    )
  }
  const returnPeriodsYr = returnPeriods(rows[top] ?? [])
  const table = tableRows(rows.slice(top + 1), returnPeriodsYr.length)
  const perIn = header.units === 'mm' ? MM_PER_IN : 1
  const made = rows.find((cells) => cells[0]?.trim().startsWith('Date/time'))?.join(',')
  return {
    ...header,
    durationLabels: table.map(({ label }) => label),
    durationsHr: table.map(({ durationHr }) => durationHr),
    returnPeriodsYr,
    depthsIn: table.map(({ depths }) => depths.map((depth) => depth / perIn)),
    ...(made ? { retrieved: made.slice(made.indexOf(':') + 1).trim() } : {}),
  }
}

function cellsOf(text: string): string[][] {
  if (typeof text !== 'string' || text.trim() === '') refuseText('The file is empty.')
  if (text.length > MOST_CHARACTERS) {
    refuseText(`The file has more than ${MOST_CHARACTERS} characters; a rainfall table is far shorter.`)
  }
  return Papa.parse<string[]>(text.replace(/^\uFEFF/, ''), { delimiter: ',' }).data
}

function refuseNoTable(text: string): never {
  const said = /ErrorMsg\s*=\s*'([^'\n]{0,200})/.exec(text)?.[1]
  return refuseText(
    said
      ? `The rainfall service gave an error in place of a table: ${said}`
      : 'This is no point-precipitation table: no line "by duration for ARI (years)" was found.',
  )
}

/** An annual-maximum file heads its columns with chances such as 1/10; the return period is their inverse. */
function returnPeriods(cells: readonly string[]): number[] {
  const years = cells
    .slice(1)
    .map((cell) => cell.trim())
    .filter((cell) => cell !== '')
    .map((cell) => Number(cell.replace(/^1\//, '')))
  if (years.length === 0 || years.some((year, index) => !(year > (years[index - 1] ?? 0)))) {
    refuseText('The return periods above the table must be numbers that rise from left to right.')
  }
  return years
}

function tableRows(rows: readonly string[][], columns: number): RainfallRow[] {
  const parsed = rows.map((cells) => rainfallRow(cells, columns))
  const end = parsed.findIndex((row) => row === undefined)
  const table = parsed.slice(0, end < 0 ? parsed.length : end).filter((row) => row !== undefined)
  if (table.length === 0) refuseText('The table has no row such as "24-hr:".')
  if (table.some(({ durationHr }, index) => durationHr <= (table[index - 1]?.durationHr ?? 0))) {
    refuseText('The durations of the table must rise from row to row.')
  }
  return table
}
