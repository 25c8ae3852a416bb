import { describe, expect, it } from 'vitest'
import { parseLevelNotesCsv, readLevelNotesCsv } from './parse-level-notes-csv.js'

const refusal = (text: string): string => {
  try {
    parseLevelNotesCsv({ text })
  } catch (error) {
    if (error instanceof Error) return error.message
  }
  return 'nothing was refused'
}

describe('parseLevelNotesCsv', () => {
  const text =
    'label,station,bs,is,fs,water_depth\nBM-1,,4.86,,,\n0+20,0+20,,6.46,,\nTP,49,3.52,,9.46,\nbed,1+15.5,,,,3.5\n'
  const rows = [
    { label: 'BM-1', backsightFt: 4.86 },
    { label: '0+20', stationFt: 20, intermediateFt: 6.46 },
    { label: 'TP', stationFt: 49, backsightFt: 3.52, foresightFt: 9.46 },
    { label: 'bed', stationFt: 115.5, waterDepthFt: 3.5 },
  ]

  it('reads the columns of a field book, with empty cells left out', () => {
    expect(parseLevelNotesCsv({ text })).toEqual(rows)
  })

  it('reads as many rows as level notes may have, and refuses more as a whole', () => {
    const rowsOf = (count: number) => `label,bs\n${'a,1.5\n'.repeat(count)}`
    expect(readLevelNotesCsv({ text: rowsOf(2000) }).rows).toHaveLength(2000)
    expect(refusal(rowsOf(2001))).toContain(
      'has 2,001 rows under its column names; at most 2,000 can be read',
    )
  })

  it.each([
    ['5.', 5],
    ['.5', 0.5],
    ['-1.25', -1.25],
    ['+4', 4],
  ])('reads the figure %s as %d', (written, figure) => {
    expect(readLevelNotesCsv({ text: `label,bs\na,${written}` }).rows).toEqual([
      { label: 'a', backsightFt: figure },
    ])
  })

  it('gives up on a figure of half a million digits without trying each of them', () => {
    const from = performance.now()
    const { errors } = readLevelNotesCsv({ text: `label,bs\na,${'1'.repeat(500_000)}x` })
    expect(errors.map(({ column }) => column)).toEqual(['bs'])
    expect(performance.now() - from).toBeLessThan(1000)
  })

  it.each([
    ['semicolons', text.replaceAll(',', ';')],
    ['tabs', text.replaceAll(',', '\t')],
    ['a byte order mark and Windows line ends', `\uFEFF${text.replaceAll('\n', '\r\n')}`],
    ['empty lines', text.replaceAll('\n', '\n\n')],
    [
      'other spellings',
      text.replace('label,station,bs,is,fs,water_depth', 'Point,Sta.,Back Sight,IFS,Foresight (ft),Depth'),
    ],
    ['quoted cells', text.replace('BM-1', '"BM-1"')],
  ])('reads the same rows with %s', (_case, written) => {
    expect(parseLevelNotesCsv({ text: written })).toEqual(rows)
  })

  it('leaves remarks and worked-out columns unread, and names a row by its station', () => {
    const book = 'remarks,station,bs,is,fs,HI,Elev\n"start, by the oak",,4.86,,,109.06,104.2\n,0+20,,6.46,,,'
    expect(() => parseLevelNotesCsv({ text: book })).toThrow(/column label is missing/)
    expect(
      parseLevelNotesCsv({
        text: book.replaceAll(/^/gm, 'x,').replace('x,', 'label,').replace('\nx,,', '\n,,'),
      }),
    ).toEqual([
      { label: 'x', backsightFt: 4.86 },
      { label: '0+20', stationFt: 20, intermediateFt: 6.46 },
    ])
  })

  it('names row and column of every figure that is no number', () => {
    const message = refusal('label,station,bs,is,fs\nBM,,4.8b,,\n,,,,\nA,2+x,,"6,46",')
    expect(message).toContain('Row 2, column "bs": "4.8b" is not a number such as 4.86.')
    expect(message).toContain('Row 4, column "station": "2+x" is not a number such as 0+42 or 42.')
    expect(message).toContain('Row 4, column "is": "6,46" is not a number such as 5.86.')
  })

  it('shows ten bad figures and counts the rest', () => {
    const message = refusal(`label,bs\n${'A,x\n'.repeat(14)}`)
    expect(message.match(/Row /g)).toHaveLength(10)
    expect(message).toMatch(/And 4 more\.$/)
  })

  it.each([
    ['', 'The file is empty'],
    ['\n\n', 'The file is empty'],
    ['label,bs,is\n', 'no rows under them'],
    ['PK\u0003\u0004\u0000\u0000binary', 'not a text file'],
    ['station,elevation\n0,100', 'column label and bs is missing'],
    ['label,bs,fs,foresight\nA,1,,', 'column fs stands there twice'],
    ['label,bs,foresite\nA,1,', '"foresite" is not a column'],
    ['<html><body>not here</body></html>', 'must name the columns'],
    ['label,bs\n"A,1\nB,2', 'quotation mark that is not closed'],
  ])('refuses the file %j and says why', (written, sentence) => {
    expect(refusal(written)).toContain(sentence)
  })
})

describe('a field book read for a form', () => {
  it('keeps every row and names each bad figure by its file row and column', () => {
    const text = 'label,station,bs,is,fs\nBM,,4.86,,\n0+00,0+00,,x,\n\n0+20,0+20,,6.46,'
    const { rows, errors } = readLevelNotesCsv({ text })
    expect(rows).toEqual([
      { label: 'BM', backsightFt: 4.86 },
      { label: '0+00', stationFt: 0 },
      { label: '0+20', stationFt: 20, intermediateFt: 6.46 },
    ])
    expect(errors).toEqual([
      { row: 3, column: 'is', message: 'Row 3, column "is": "x" is not a number such as 5.86.' },
    ])
  })

  it('refuses a file that is no table of level notes as a whole', () => {
    expect(() => readLevelNotesCsv({ text: '%PDF-1.7\n1 0 obj' })).toThrow(/column/i)
  })
})
