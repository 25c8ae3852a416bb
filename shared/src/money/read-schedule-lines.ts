import { csvTable, type CsvLine } from '../csv/csv-table.js'
import { quantityKeys } from '../engineering/design/quantity-catalogue.js'
import { mostScheduleLines, scheduleLineSchema, type ScheduleLine } from '../schemas/schedule.js'
import { scheduleColumnOf, scheduleColumns, type ScheduleColumn } from './schedule-columns.js'

export interface ScheduleCsvError {
  /** As the file counts, the column names being row 1. */
  row: number
  column: ScheduleColumn
  message: string
}

export interface ScheduleCsv {
  lines: ScheduleLine[]
  errors: ScheduleCsvError[]
}

type Row = CsvLine<ScheduleColumn>

/** No two lines may share one of these: a line is mapped by its code, and a quantity is paid by one line. */
const UNIQUE = ['code', 'quantity_key'] as const satisfies readonly ScheduleColumn[]

/**
 * Lines of a payment schedule from a CSV file (comma, semicolon or tab). First row: code, practice, title, unit,
 * base_rate, and where there are any higher_rate and quantity_key, in any order. Rates may carry a dollar sign and
 * commas between thousands. A line with a fault is left out of `lines` and each fault is named in `errors`, so that the
 * whole file can be mended at once.
 *
 * @param input.text content of the file; rates in dollars a unit, up to four places.
 * @throws EngineeringInputError naming `text` when the file as a whole is no payment schedule.
 * @example readScheduleLinesCsv({ text: 'code,practice,title,unit,base_rate\nA1,561,Stone,ton,24.00' }).lines
 */
export function readScheduleLinesCsv({ text }: { text: string }): ScheduleCsv {
  const rows = csvTable({
    text,
    content: 'payment schedule',
    mostRows: mostScheduleLines,
    columnsOf: scheduleColumns,
  })
  const firstRows = UNIQUE.map((column) => [column, firstRowBy(column, rows)] as const)
  const read = rows.map((row) => {
    const parsed = scheduleLineSchema.safeParse(cellsOf(row))
    const errors = [
      ...(parsed.error?.issues ?? []).map(({ path, message }) => {
        const column = scheduleColumnOf[path[0] as keyof ScheduleLine]
        return faultOf(row, column, `${message}.`)
      }),
      ...unknownQuantity(row),
      ...firstRows.flatMap(([column, firstRow]) => repeated(row, column, firstRow)),
    ]
    return { lines: parsed.success && errors.length === 0 ? [parsed.data] : [], errors }
  })
  return { lines: read.flatMap(({ lines }) => lines), errors: read.flatMap(({ errors }) => errors) }
}

function cellsOf({ at }: Row) {
  return {
    code: at('code'),
    practice: at('practice'),
    title: at('title'),
    unit: at('unit'),
    baseRate: plainRate(at('base_rate')),
    ...(at('higher_rate') === '' ? {} : { higherRate: plainRate(at('higher_rate')) }),
    quantityKey: at('quantity_key') || null,
  }
}

/** A spreadsheet writes 1,204.5 dollars as $1,204.50. Anything else stays as it is, for the schema to judge. */
const plainRate = (written: string): string =>
  /^\$?\s*(\d+|\d{1,3}(,\d{3})+)(\.\d+)?$/.test(written) ? written.replace(/[$,\s]/g, '') : written

function unknownQuantity(row: Row): ScheduleCsvError[] {
  const key = row.at('quantity_key')
  if (key === '' || quantityKeys.some((known) => known === key)) return []
  return [faultOf(row, 'quantity_key', `Use one of ${quantityKeys.join(', ')}, or leave it empty.`)]
}

/** The first row of the file with each cell of a column. */
function firstRowBy(column: ScheduleColumn, rows: readonly Row[]): ReadonlyMap<string, number> {
  const first = new Map<string, number>()
  for (const { at, fileRow } of rows) if (!first.has(at(column))) first.set(at(column), fileRow)
  return first
}

function repeated(
  row: Row,
  column: ScheduleColumn,
  firstRow: ReadonlyMap<string, number>,
): ScheduleCsvError[] {
  const first = firstRow.get(row.at(column))
  if (row.at(column) === '' || first === undefined || first === row.fileRow) return []
  return [faultOf(row, column, `Row ${first} has it already.`)]
}

function faultOf({ fileRow, at }: Row, column: ScheduleColumn, advice: string): ScheduleCsvError {
  const written = at(column) === '' ? 'is empty' : `is "${at(column)}"`
  return { row: fileRow, column, message: `Row ${fileRow}, column "${column}" ${written}. ${advice}` }
}
