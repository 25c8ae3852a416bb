import { formatStation, parseStation } from 'shared'
import { parseQuantity } from '../../components/fields/parse-quantity'

/** One column that is typed into. The cell keeps what was typed; `read` says what it means. */
export interface GridColumn {
  key: string
  title: string
  width: number
  isText?: boolean
  read: (typed: string) => unknown
  write: (value: unknown) => string
}

export type GridRow = Readonly<Record<string, string>>

const plain = (value: unknown): string => (value === undefined ? '' : String(value))

const writeStation = (value: unknown): string =>
  typeof value === 'number'
    ? formatStation({ stationFt: value, decimals: Number.isInteger(value) ? 0 : 2 })
    : plain(value)

const text = (key: string, title: string, width: number): GridColumn => ({
  ...{ key, title, width, isText: true, write: plain },
  read: (typed) => typed,
})

const station: GridColumn = {
  ...{ key: 'stationFt', title: 'Station', width: 84, write: writeStation },
  read: (typed) => parseStation(typed) ?? typed,
}

const figure = (key: string, title: string): GridColumn => ({
  ...{ key, title, width: 84, write: plain },
  read: (typed) => parseQuantity(typed) ?? typed,
})

/** In the order of a field book; heights of instrument and elevations are worked out between them. */
export const noteColumns: readonly GridColumn[] = [
  text('label', 'Point', 200),
  station,
  figure('backsightFt', 'Backsight'),
  figure('intermediateFt', 'Intermediate'),
  figure('foresightFt', 'Foresight'),
  figure('waterDepthFt', 'Water depth'),
]

export const pointColumns: readonly GridColumn[] = [
  station,
  figure('elevationFt', 'Elevation'),
  figure('waterDepthFt', 'Water depth'),
]
