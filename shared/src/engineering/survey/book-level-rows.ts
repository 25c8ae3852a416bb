import { Decimal } from 'decimal.js'
import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { levelRowKind } from './level-row-kind.js'
import type { LevelRow } from './reduce-level-notes.js'

export interface BookedPoint {
  label: string
  stationFt: number | undefined
  elevation: Decimal
  instrumentHeight: Decimal
  /** Number of the setup that the point was read from, 0 for the first point. */
  readFromSetup: number
}

export interface LevelBook {
  points: BookedPoint[]
  sumBacksight: Decimal
  sumForesight: Decimal
  setups: number
  instrumentHeight: Decimal
  /** Absent while the last setup still stands open, since then nothing closes on a point. */
  lastForesightElevation: Decimal | undefined
}

interface BookInput {
  startElevationFt: number
  rows: readonly LevelRow[]
  waterSurfaceFt: number | undefined
}

/** Walks the field book row by row. */
export function bookLevelRows({ startElevationFt, rows, waterSurfaceFt }: BookInput): LevelBook {
  const zero = new Decimal(0)
  const book: LevelBook = {
    points: [],
    sumBacksight: zero,
    sumForesight: zero,
    setups: 0,
    instrumentHeight: new Decimal(startElevationFt),
    lastForesightElevation: undefined,
  }
  rows.forEach((row, index) => {
    const kind = levelRowKind({ row, index })
    const readFromSetup = book.setups
    const elevation =
      kind === 'start'
        ? book.instrumentHeight
        : kind === 'sounding'
          ? soundingElevation({ row, waterSurfaceFt })
          : book.instrumentHeight.minus(row.foresightFt ?? row.intermediateFt ?? 0)
    if (row.foresightFt !== undefined) {
      closeSetup({ book, foresightFt: row.foresightFt, elevation, index })
    }
    if (row.backsightFt !== undefined) {
      openSetup({ book, backsightFt: row.backsightFt, elevation })
    }
    const stationFt = row.stationFt === undefined ? undefined : stationOf(row.stationFt, index)
    book.points.push({
      label: row.label,
      stationFt,
      elevation,
      instrumentHeight: book.instrumentHeight,
      readFromSetup,
    })
  })
  return book
}

function closeSetup(given: {
  book: LevelBook
  foresightFt: number
  elevation: Decimal
  index: number
}): void {
  const { book, foresightFt, elevation, index } = given
  if (book.lastForesightElevation !== undefined) {
    throw new EngineeringInputError({
      field: `rows[${index}].foresightFt`,
      message: `Row ${index + 1}: a second foresight from the same instrument position; enter the earlier one as an intermediate sight.`,
    })
  }
  book.sumForesight = book.sumForesight.plus(foresightFt)
  book.lastForesightElevation = elevation
}

function openSetup({
  book,
  backsightFt,
  elevation,
}: {
  book: LevelBook
  backsightFt: number
  elevation: Decimal
}): void {
  book.sumBacksight = book.sumBacksight.plus(backsightFt)
  book.instrumentHeight = elevation.plus(backsightFt)
  book.setups += 1
  book.lastForesightElevation = undefined
}

function soundingElevation({
  row,
  waterSurfaceFt,
}: {
  row: LevelRow
  waterSurfaceFt: number | undefined
}): Decimal {
  const surface = requireNumber({ field: 'waterSurfaceFt', value: waterSurfaceFt })
  return new Decimal(surface).minus(row.waterDepthFt ?? 0)
}

function stationOf(stationFt: number, index: number): number {
  return requireNumber({ field: `rows[${index}].stationFt`, value: stationFt })
}
