import { EngineeringInputError } from '../engineering-input-error.js'

export type LevelNotesColumn = 'label' | 'station' | 'bs' | 'is' | 'fs' | 'water_depth'

/** Spellings met in field books, letters only. Columns a book has worked out itself are left unread. */
const SPELLINGS: Readonly<Record<string, LevelNotesColumn | 'unread'>> = {
  label: 'label',
  point: 'label',
  pt: 'label',
  name: 'label',
  description: 'label',
  station: 'station',
  sta: 'station',
  stationft: 'station',
  chainage: 'station',
  bs: 'bs',
  backsight: 'bs',
  backsightft: 'bs',
  is: 'is',
  ifs: 'is',
  intermediate: 'is',
  intermediatesight: 'is',
  intermediateft: 'is',
  fs: 'fs',
  foresight: 'fs',
  foresightft: 'fs',
  waterdepth: 'water_depth',
  waterdepthft: 'water_depth',
  depth: 'water_depth',
  depthft: 'water_depth',
  hi: 'unread',
  elev: 'unread',
  elevation: 'unread',
  elevationft: 'unread',
  rl: 'unread',
  remarks: 'unread',
  remark: 'unread',
  notes: 'unread',
  note: 'unread',
  comment: 'unread',
}

const WANTED = 'label, station, bs, is, fs, water_depth'

/** Position of every column by its meaning. */
export function levelNotesColumns(header: readonly string[]): Map<LevelNotesColumn, number> {
  const columns = new Map<LevelNotesColumn, number>()
  for (const [index, title] of header.entries()) {
    const meaning = SPELLINGS[title.toLowerCase().replace(/[^a-z]/g, '')]
    if (meaning === undefined && title.trim() !== '')
      return refuse(`"${title.trim()}" is not a column of level notes`)
    if (meaning === undefined || meaning === 'unread') continue
    if (columns.has(meaning)) return refuse(`the column ${meaning} stands there twice`)
    columns.set(meaning, index)
  }
  const missing = (['label', 'bs'] as const).filter((name) => !columns.has(name))
  if (missing.length > 0) return refuse(`the column ${missing.join(' and ')} is missing`)
  return columns
}

function refuse(sentence: string): never {
  throw new EngineeringInputError({
    field: 'text',
    message: `The first row of the file must name the columns ${WANTED}: ${sentence}.`,
  })
}
