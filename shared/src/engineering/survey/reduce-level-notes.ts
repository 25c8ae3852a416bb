import { Decimal } from 'decimal.js'
import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { type AllowableRule, allowableMisclosure, type LevelClosing } from './allowable-misclosure.js'
import { type BookedPoint, bookLevelRows } from './book-level-rows.js'

/** One row of the field book. The first has a backsight only; a row with both sights is a turning point. */
export interface LevelRow {
  label: string
  stationFt?: number
  backsightFt?: number
  intermediateFt?: number
  foresightFt?: number
  waterDepthFt?: number
}

export interface ReduceLevelNotesInput {
  startElevationFt: number
  rows: readonly LevelRow[]
  waterSurfaceFt?: number
  closing?: LevelClosing
  adjust?: boolean
}

export interface LevelPoint {
  label: string
  stationFt?: number
  elevationFt: number
  instrumentHeightFt: number
  adjustedElevationFt?: number
}

export interface ReducedLevelNotes {
  points: LevelPoint[]
  sumBacksightFt: number
  sumForesightFt: number
  differenceFt: number
  checkedAgainst: 'last-point' | 'last-instrument-height'
  arithmeticCheckPasses: boolean
  setups: number
  misclosureFt?: number
  allowableFt?: number
  allowableRule?: AllowableRule
  closes?: boolean
}

/** Half of the least rod reading, 0.001 ft: less than this is not a difference. */
const CHECK_FT = 0.0005

/**
 * Level notes reduced: HI = elevation + BS; elevation = HI − IS or HI − FS; at a turning point the foresight comes
 * first. Page check: ΣBS − ΣFS = last foresight point − first, or last HI − first when the last setup has no
 * foresight. Misclosure = computed − known; correction = −misclosure · (setups so far / all setups). Reckoned in
 * decimals, so that 104.20 + 4.86 − 9.46 is 99.6.
 *
 * @param input.startElevationFt elevation of the first row, ft.
 * @param input.rows 2 or more rows in field order, sights in ft (a negative one is an inverted rod), depths in ft ≥ 0.
 * @param input.waterSurfaceFt ft, only for rows with `waterDepthFt`.
 * @param input.closing known elevation and the allowable: coefficientFt with lengthMiles or lengthFt, perSetupFt, or
 *   minimumFt; the largest applies.
 * @param input.adjust true adds `adjustedElevationFt` to every point (needs `closing`).
 * @returns elevations and heights of instrument (ft; a turning point carries its new one), sums, checks, closure.
 * @throws EngineeringInputError naming the row by number.
 * @see US Navy Engineering Aid training manual 14071, "Level Computations"; limits of closure are district settings.
 * @example reduceLevelNotes({ startElevationFt: 100, rows: [{ label: 'BM', backsightFt: 4.32 },
 *   { label: '0+00', intermediateFt: 5 }] }).points[1]?.elevationFt // 99.32
 */
export function reduceLevelNotes(input: ReduceLevelNotesInput): ReducedLevelNotes {
  const { rows, closing } = input
  if (!Array.isArray(rows) || rows.length < 2) {
    throw new EngineeringInputError({ field: 'rows', message: 'Level notes need at least two rows.' })
  }
  const startElevationFt = requireNumber({ field: 'startElevationFt', value: input.startElevationFt })
  const book = bookLevelRows({ startElevationFt, rows, waterSurfaceFt: input.waterSurfaceFt })
  const difference = book.sumBacksight.minus(book.sumForesight)
  const end = book.lastForesightElevation ?? book.instrumentHeight
  const reduced: ReducedLevelNotes = {
    points: book.points.map(pointOf),
    sumBacksightFt: book.sumBacksight.toNumber(),
    sumForesightFt: book.sumForesight.toNumber(),
    differenceFt: difference.toNumber(),
    checkedAgainst: book.lastForesightElevation ? 'last-point' : 'last-instrument-height',
    arithmeticCheckPasses: difference.minus(end.minus(startElevationFt)).abs().lt(CHECK_FT),
    setups: book.setups,
  }
  if (closing === undefined) return reduced
  const known = requireNumber({ field: 'closing.knownElevationFt', value: closing.knownElevationFt })
  const allowable = allowableMisclosure({ closing, setups: book.setups })
  if (book.lastForesightElevation === undefined) return { ...reduced, ...allowable }
  const misclosure = book.lastForesightElevation.minus(known)
  return {
    ...reduced,
    ...allowable,
    points: input.adjust
      ? adjusted({ points: book.points, misclosure, setups: book.setups })
      : reduced.points,
    misclosureFt: misclosure.toNumber(),
    closes: misclosure.abs().lte(allowable.allowableFt),
  }
}

function pointOf({ label, stationFt, elevation, instrumentHeight }: BookedPoint): LevelPoint {
  const station = stationFt === undefined ? {} : { stationFt }
  return {
    label,
    ...station,
    elevationFt: elevation.toNumber(),
    instrumentHeightFt: instrumentHeight.toNumber(),
  }
}

function adjusted(given: { points: BookedPoint[]; misclosure: Decimal; setups: number }): LevelPoint[] {
  return given.points.map((point) => {
    const correction = given.misclosure.times(point.readFromSetup).div(given.setups)
    return { ...pointOf(point), adjustedElevationFt: point.elevation.minus(correction).toNumber() }
  })
}
