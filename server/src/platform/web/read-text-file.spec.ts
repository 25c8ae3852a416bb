import { Problem, readScheduleLinesCsv } from 'shared'
import { readTextFile } from './read-text-file'

const readSchedule = (bytes: Uint8Array) => readTextFile(bytes, (text) => readScheduleLinesCsv({ text }))

const columns = 'code,practice,title,unit,base_rate'
const inWindows = (text: string): Buffer => Buffer.from(text, 'latin1')

describe('an uploaded schedule', () => {
  it.each([
    ['UTF-8', Buffer.from(`${columns}\nA1,561,Stone 6–9″ d½,ton,24.00`), 'Stone 6–9″ d½'],
    ['UTF-8 with a mark', Buffer.from(`\uFEFF${columns}\nA1,561,d½,ton,24.00`), 'd½'],
    ['Windows', inWindows(`${columns}\nA1,561,Stone d\xBD,ton,24.00`), 'Stone d½'],
  ])('is read in %s', (_, bytes, title) => {
    expect(readSchedule(bytes)).toMatchObject({ lines: [{ code: 'A1', title }], errors: [] })
  })

  it('names the faults of a line and gives the good lines', () => {
    const { lines, errors } = readSchedule(
      Buffer.from(`${columns}\nA1,561,Stone,ton,24.00\nA2,56,Sand,ton,1`),
    )
    expect(lines.map(({ code }) => code)).toEqual(['A1'])
    expect(errors.map(({ row, column }) => [row, column])).toEqual([[3, 'practice']])
  })

  it('that is no table at all is refused as a file', () => {
    const read = () => readSchedule(Buffer.from([0x25, 0x50, 0x44, 0x46, 0x00]))
    expect(read).toThrow(Problem)
    expect(read).toThrow(expect.objectContaining({ slug: 'unreadable-file' }))
  })
})
