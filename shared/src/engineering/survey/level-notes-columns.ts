import { csvColumns } from '../../csv/csv-columns.js'

const WANTED = ['label', 'station', 'bs', 'is', 'fs', 'water_depth'] as const

export type LevelNotesColumn = (typeof WANTED)[number]

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

/** Position of every column by its meaning. */
export const levelNotesColumns = (header: readonly string[]): Map<LevelNotesColumn, number> =>
  csvColumns({
    header,
    content: 'level notes',
    wanted: WANTED,
    needed: ['label', 'bs'],
    spellings: SPELLINGS,
  })
