import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { interpolateTemperature } from './interpolate-temperature.js'
import {
  COW_GALLONS,
  COW_MILK_LB,
  COW_TEMPERATURES_F,
  COW_WEIGHTS_LB,
  K_STATE_SOURCE,
} from './water-tables.js'

export interface HeadWater {
  perHeadGal: number
  row: string
  source: string
  extrapolated: boolean
}

interface CowInput {
  field: string
  weightLb: number | undefined
  milkLb: number | undefined
  temperatureF: number
}

interface Share {
  low: number
  high: number
  share: number
}

/** A beef cow's day by weight, milk and temperature, straight between the rows of the printed table. */
export function cowWater({ field, weightLb, milkLb, temperatureF }: CowInput): HeadWater {
  const weight = inTable({ field: `${field}.weightLb`, value: weightLb, printed: COW_WEIGHTS_LB })
  const milk = inTable({ field: `${field}.milkLb`, value: milkLb, printed: COW_MILK_LB })
  const at = (weightIndex: number, milkIndex: number) =>
    interpolateTemperature(
      { temperaturesF: COW_TEMPERATURES_F, gallons: COW_GALLONS[weightIndex]?.[milkIndex] ?? [] },
      temperatureF,
    )
  const between = (weightIndex: number) =>
    mix(at(weightIndex, milk.low).gallons, at(weightIndex, milk.high).gallons, milk.share)
  const hottest = COW_TEMPERATURES_F[COW_TEMPERATURES_F.length - 1] ?? 0
  return {
    perHeadGal: mix(between(weight.low), between(weight.high), weight.share),
    row: `${Number(weightLb).toLocaleString('en-US')} lb cow, ${milkLb} lb milk, ${temperatureF} F (K-State 2018)`,
    source: K_STATE_SOURCE,
    extrapolated: temperatureF > hottest,
  }
}

function inTable(given: { field: string; value: number | undefined; printed: readonly number[] }): Share {
  const { field, printed } = given
  const value = requireNumber({ field, value: given.value })
  const [first = 0] = printed
  const last = printed.at(-1) ?? 0
  if (value < first || value > last) {
    throw new EngineeringInputError({
      field,
      message: `${field} is ${value}; the table runs from ${first} to ${last}. Enter the gallons per head (perHeadGal) instead.`,
    })
  }
  const high = Math.max(
    1,
    printed.findIndex((figure) => value <= figure),
  )
  const [from = 0, to = 1] = [printed[high - 1], printed[high]]
  return { low: high - 1, high, share: (value - from) / (to - from) }
}

/** Exact at both ends, so that a printed row comes back as printed. */
function mix(low: number, high: number, share: number): number {
  return low * (1 - share) + high * share
}
