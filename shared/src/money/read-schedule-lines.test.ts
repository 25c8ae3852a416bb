import { describe, expect, it } from 'vitest'
import { readScheduleLinesCsv } from './read-schedule-lines.js'

const header = 'code,practice,title,unit,base_rate,higher_rate,quantity_key'
const stone = 'SB-01,561,"Surface stone, in place",ton,24.00,28.80,stone-surface'
const text = `${header}\n${stone}\nSB-02,382,Fence,ft,2.1,,\n`
const lines = [
  {
    code: 'SB-01',
    practice: '561',
    title: 'Surface stone, in place',
    unit: 'ton',
    baseRate: '24.00',
    higherRate: '28.80',
    quantityKey: 'stone-surface',
  },
  { code: 'SB-02', practice: '382', title: 'Fence', unit: 'ft', baseRate: '2.1', quantityKey: null },
]
const refusal = (written: string): string => {
  try {
    readScheduleLinesCsv({ text: written })
  } catch (error) {
    if (error instanceof Error) return error.message
  }
  return 'nothing was refused'
}
const faults = (row: string) =>
  readScheduleLinesCsv({ text: `${header}\n${row}` }).errors.map(({ column, message }) => [column, message])

describe('readScheduleLinesCsv', () => {
  it('reads every column, and leaves out a higher rate and a mapping that are empty', () => {
    expect(readScheduleLinesCsv({ text })).toEqual({ lines, errors: [] })
  })

  it.each([
    ['a byte order mark and Windows line ends', `\uFEFF${text.replaceAll('\n', '\r\n')}`],
    ['empty rows', text.replaceAll('\n', '\n\n')],
    ['semicolons', text.replace('Surface stone, in', 'Surface stone; in').replaceAll(',', ';')],
    ['tabs', text.replace('Surface stone, in', 'Surface stone; in').replaceAll(',', '\t')],
    [
      'other spellings and capitals',
      text.replace(header, 'Code,Practice code,Description,Units,Rate,Higher rate ($),Quantity key'),
    ],
  ])('reads the same lines with %s', (_case, written) => {
    const read = readScheduleLinesCsv({ text: written })
    expect(read.errors).toEqual([])
    expect(read.lines.map(({ title, ...rest }) => ({ ...rest, title: title.replace(';', ',') }))).toEqual(
      lines,
    )
  })

  it.each([
    ['$24.00', '24.00'],
    ['"$1,204.50"', '1204.50'],
    ['$ 7', '7'],
    ['"12,345,678.1234"', '12345678.1234'],
  ])('reads a rate that a spreadsheet wrote as %s', (written, baseRate) => {
    const { lines: read } = readScheduleLinesCsv({ text: `${header}\nA,561,Stone,ton,${written},,` })
    expect(read.map((line) => line.baseRate)).toEqual([baseRate])
  })

  it.each([
    ['A,56,Stone,ton,24.00,,', 'practice', /Row 2, column "practice" is "56"\..*three digits/],
    ['A,561,Stone,ton,"24,5",,', 'base_rate', /column "base_rate" is "24,5"\. Give a rate in dollars/],
    ['A,561,Stone,ton,,,', 'base_rate', /column "base_rate" is empty\. Give a rate in dollars/],
    ['A,561,Stone,ton,-3,,', 'base_rate', /is "-3"/],
    ['A,561,Stone,ton,24.12345,,', 'base_rate', /up to four places/],
    ['A,561,Stone,ton,24,x,', 'higher_rate', /column "higher_rate" is "x"/],
    [',561,Stone,ton,24,,', 'code', /column "code" is empty\. This must not be empty/],
    ['A,561,,ton,24,,', 'title', /column "title" is empty/],
    [
      'A,561,Stone,ton,24,,gravel',
      'quantity_key',
      /is "gravel"\. Use one of excavation-dry,.*leave it empty/,
    ],
  ])('leaves out the line %s and says which column and what would be right', (row, column, sentence) => {
    expect(faults(row)).toEqual([[column, expect.stringMatching(sentence)]])
    expect(readScheduleLinesCsv({ text: `${header}\n${row}` }).lines).toEqual([])
  })

  it('refuses a second line with the same code or for the same quantity, and keeps the first', () => {
    const { lines: read, errors } = readScheduleLinesCsv({
      text: `${header}\n${stone}\nSB-01,561,Again,ton,1,,\n\nSB-03,561,More,ton,1,,stone-surface`,
    })
    expect(read.map(({ title }) => title)).toEqual(['Surface stone, in place'])
    expect(errors).toEqual([
      { row: 3, column: 'code', message: 'Row 3, column "code" is "SB-01". Row 2 has it already.' },
      {
        row: 5,
        column: 'quantity_key',
        message: 'Row 5, column "quantity_key" is "stone-surface". Row 2 has it already.',
      },
    ])
  })

  const rowsOf = (count: number) =>
    Array.from({ length: count }, (_, index) => `A${index},561,Stone,ton,24,,\n`).join('')

  it('reads as many rows as a schedule may have lines, and refuses more before it reads any', () => {
    const { lines: read, errors } = readScheduleLinesCsv({ text: `${header}\n${rowsOf(2000)}` })
    expect([read.length, errors]).toEqual([2000, []])
    expect(refusal(`${header}\n${rowsOf(2001)}`)).toBe(
      'The file has 2,001 rows under its column names; at most 2,000 can be read. Leave out the rows that are not needed.',
    )
  })

  it('names every fault of a row at once', () => {
    expect(faults('A,5,Stone,ton,x,y,z').map(([column]) => column)).toEqual([
      'practice',
      'base_rate',
      'higher_rate',
      'quantity_key',
    ])
  })

  it.each([
    ['', 'The file is empty'],
    [header, 'no rows under them'],
    ['%PDF-1.7\n1 0 obj', 'must name the columns code, practice, title, unit, base_rate'],
    ['PK\u0003\u0004\u0000', 'Save the payment schedule as CSV'],
    ['code,title\nA,B', 'the column practice and unit and base_rate is missing'],
    ['code,practice,title,unit,rate,base_rate\nA', 'base_rate stands there twice'],
    ['code,practice,title,unit,rate,higer_rate\nA', '"higer_rate" is not a column of a payment schedule'],
    [`${header}\n"A,561`, 'quotation mark that is not closed'],
  ])('refuses the file %j as a whole and says why', (written, sentence) => {
    expect(refusal(written)).toContain(sentence)
  })
})
