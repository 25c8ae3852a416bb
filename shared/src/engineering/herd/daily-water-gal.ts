import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { cowWater, type HeadWater } from './cow-water.js'
import { interpolateTemperature } from './interpolate-temperature.js'
import { KIND_ROWS, type KindRow } from './water-tables.js'

export type AnimalKind = 'beef-cow' | 'other' | keyof typeof KIND_ROWS

export interface AnimalClass {
  kind: AnimalKind
  head: number
  weightLb?: number
  milkLb?: number
  temperatureF: number
  /** Typed by the planner; holds over the table. */
  perHeadGal?: number
}

export interface ClassWater extends HeadWater {
  kind: AnimalKind
  head: number
  totalGal: number
}

export interface DailyWater {
  classes: ClassWater[]
  totalGal: number
}

const TYPED = 'typed by the planner'

/**
 * Drinking water of a herd on one day: Σ head · gallons per head, from a printed table by kind. A beef cow's row is
 * interpolated in weight, milk and temperature; the other kinds in temperature. Below the coldest row that row holds;
 * above 90 °F the table's slope goes on and the class is marked `extrapolated`.
 *
 * @param input.classes 1 or more: kind; head whole number ≥ 0; temperatureF −60 to 140 °F; for 'beef-cow' weightLb
 *   1,100–1,500 lb and milkLb 0–25 lb a day; perHeadGal gal > 0 overrides the table and is required for 'other'.
 * @returns per class gallons per head and in total, the row used and its source; totalGal, US gallons a day.
 * @throws EngineeringInputError naming the class and field.
 * @see K-State Beef Tips, Water: Questions and Answers (Waggoner), 30 April 2018; Beef Magazine, Watch Summer Water;
 *   University of Maine Pasture Management Course, lesson 7.
 * @example dailyWaterGal({ classes: [{ kind: 'beef-cow', head: 75, weightLb: 1300, milkLb: 25, temperatureF: 90 }] })
 *   .totalGal // 1477.5
 */
export function dailyWaterGal({ classes }: { classes: readonly AnimalClass[] }): DailyWater {
  if (!Array.isArray(classes) || classes.length === 0) {
    throw new EngineeringInputError({
      field: 'classes',
      message: 'The herd needs at least one class of animals.',
    })
  }
  const reckoned = classes.map((animals: AnimalClass, index): ClassWater => {
    const field = `classes[${index}]`
    const head = requireNumber({ field: `${field}.head`, value: animals.head, min: 0, integer: true })
    const water = headWater({ animals, field })
    return { kind: animals.kind, head, ...water, totalGal: head * water.perHeadGal }
  })
  return { classes: reckoned, totalGal: reckoned.reduce((sum, { totalGal }) => sum + totalGal, 0) }
}

function headWater({ animals, field }: { animals: AnimalClass; field: string }): HeadWater {
  if (animals.perHeadGal !== undefined || animals.kind === 'other') {
    const perHeadGal = requireNumber({
      field: `${field}.perHeadGal`,
      value: animals.perHeadGal,
      exclusiveMin: 0,
    })
    return { perHeadGal, row: TYPED, source: TYPED, extrapolated: false }
  }
  const { kind, weightLb, milkLb } = animals
  const value = animals.temperatureF
  const temperatureF = requireNumber({ field: `${field}.temperatureF`, value, min: -60, max: 140 })
  if (kind === 'beef-cow') return cowWater({ field, weightLb, milkLb, temperatureF })
  const row: KindRow | undefined = KIND_ROWS[kind]
  if (row === undefined) {
    throw new EngineeringInputError({
      field: `${field}.kind`,
      message: `"${String(kind)}" is not a kind of animal in the tables; choose other and enter the gallons per head.`,
    })
  }
  const figure = interpolateTemperature(row, temperatureF)
  const heat = row.temperaturesF.length > 0 ? `, ${temperatureF} F` : ''
  return {
    perHeadGal: figure.gallons,
    row: `${row.row}${heat} (${row.shortSource})`,
    source: row.source,
    extrapolated: figure.extrapolated,
  }
}
