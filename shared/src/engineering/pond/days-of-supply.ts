import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'
import { GAL_PER_FT3, IN_PER_FT } from '../unit-factors.js'
import { pondAreaFt2 } from './pond-area-ft2.js'
import { pondStages, type PondStage } from './pond-stages.js'

export interface DaysOfSupplyInput {
  stages: readonly PondStage[]
  fromElevationFt: number
  toElevationFt: number
  dailyWaterGal: number
  evaporationInPerDay: number
  seepageInPerDay: number
}

/** One fall of the water between two stages. */
export interface SupplyStep {
  fromElevationFt: number
  toElevationFt: number
  storageFt3: number
  lossFt3PerDay: number
  days: number
}

export interface DaysOfSupply {
  usePerDayFt3: number
  usableFt3: number
  days: number
  /** From the top down. */
  steps: SupplyStep[]
}

/**
 * Days until a pond falls from one level to another while the herd drinks, with no rain and no inflow. Stage by stage:
 * days = ΔV / (use + (evaporation + seepage)/12 · mean area), ΔV and mean area by average end area; use = gal / 7.48052.
 *
 * @param input.stages 2 or more, ascending: elevationFt ft, areaFt2 ft² ≥ 0; they must reach both levels.
 * @param input.fromElevationFt, toElevationFt ft; from at or below to gives 0 days.
 * @param input.dailyWaterGal US gal a day ≥ 0; evaporationInPerDay, seepageInPerDay in a day ≥ 0; not all three 0.
 * @returns use (ft³ a day), usable storage (ft³), days in all, and every step.
 * @throws EngineeringInputError naming the field.
 * @see storage: FHWA, HEC-22, 4th ed., February 2024, ch. 10, table 10.4; the budget is a sum of what leaves, no source.
 * @example daysOfSupply({ stages: [{ elevationFt: 96, areaFt2: 43560 }, { elevationFt: 97, areaFt2: 43560 }],
 *   fromElevationFt: 97, toElevationFt: 96, dailyWaterGal: 0, evaporationInPerDay: 0.25, seepageInPerDay: 0.25 }).days // 24
 */
export function daysOfSupply(input: DaysOfSupplyInput): DaysOfSupply {
  const stages = pondStages(input.stages)
  const { dailyWaterGal, lossInPerDay } = losses(input)
  const usePerDayFt3 = dailyWaterGal / GAL_PER_FT3
  const levels = levelsPassed(stages, {
    fromElevationFt: requireNumber({ field: 'fromElevationFt', value: input.fromElevationFt }),
    toElevationFt: requireNumber({ field: 'toElevationFt', value: input.toElevationFt }),
  })
  const steps = levels.slice(1).map((toElevationFt, index): SupplyStep => {
    const fromElevationFt = levels[index] ?? toElevationFt
    const meanAreaFt2 = (pondAreaFt2(stages, fromElevationFt) + pondAreaFt2(stages, toElevationFt)) / 2
    const storageFt3 = meanAreaFt2 * (fromElevationFt - toElevationFt)
    const lossFt3PerDay = (lossInPerDay / IN_PER_FT) * meanAreaFt2
    // A step without area holds nothing, and with no use 0/0 would be asked.
    const days = storageFt3 === 0 ? 0 : storageFt3 / (usePerDayFt3 + lossFt3PerDay)
    return { fromElevationFt, toElevationFt, storageFt3, lossFt3PerDay, days }
  })
  return {
    usePerDayFt3,
    usableFt3: steps.reduce((sum, { storageFt3 }) => sum + storageFt3, 0),
    days: steps.reduce((sum, { days }) => sum + days, 0),
    steps,
  }
}

function losses(input: DaysOfSupplyInput) {
  const atLeastZero = (field: 'dailyWaterGal' | 'evaporationInPerDay' | 'seepageInPerDay') =>
    requireNumber({ field, value: input[field], min: 0 })
  const dailyWaterGal = atLeastZero('dailyWaterGal')
  const lossInPerDay = atLeastZero('evaporationInPerDay') + atLeastZero('seepageInPerDay')
  if (dailyWaterGal + lossInPerDay === 0) {
    const message =
      'Nothing drinks and nothing is lost, so the water would last for ever; enter a use or a loss.'
    throw new EngineeringInputError({ field: 'dailyWaterGal', message })
  }
  return { dailyWaterGal, lossInPerDay }
}

/** The levels at which one step ends and the next begins, from the top down. */
function levelsPassed(
  stages: readonly PondStage[],
  { fromElevationFt, toElevationFt }: Pick<DaysOfSupplyInput, 'fromElevationFt' | 'toElevationFt'>,
): number[] {
  if (fromElevationFt <= toElevationFt) return []
  const highest = stages.at(-1)?.elevationFt ?? 0
  const lowest = stages[0]?.elevationFt ?? 0
  if (fromElevationFt > highest || toElevationFt < lowest) {
    const message = `The areas of the pond are given from ${forWords(lowest)} to ${forWords(highest)} ft; they must reach from ${forWords(toElevationFt)} to ${forWords(fromElevationFt)} ft.`
    throw new EngineeringInputError({ field: 'stages', message })
  }
  const between = stages
    .map(({ elevationFt }) => elevationFt)
    .filter((elevationFt) => elevationFt > toElevationFt && elevationFt < fromElevationFt)
  return [fromElevationFt, ...between.reverse(), toElevationFt]
}
