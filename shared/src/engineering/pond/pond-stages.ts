import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'
import { requireNumber } from '../require-number.js'

/** Area of the water at one level. */
export interface PondStage {
  elevationFt: number
  areaFt2: number
}

/**
 * The stages of a pond as formulas can use them: two or more, from the bottom up.
 *
 * @throws EngineeringInputError naming the stage whose figure is missing or whose level does not rise.
 */
export function pondStages(stages: readonly PondStage[]): PondStage[] {
  if (!Array.isArray(stages) || stages.length < 2) {
    const message = 'The pond needs its water area at two levels or more.'
    throw new EngineeringInputError({ field: 'stages', message })
  }
  const read = stages.map((stage: PondStage, index): PondStage => {
    const field = `stages[${index}]`
    return {
      elevationFt: requireNumber({ field: `${field}.elevationFt`, value: stage.elevationFt }),
      areaFt2: requireNumber({ field: `${field}.areaFt2`, value: stage.areaFt2, min: 0 }),
    }
  })
  read.slice(1).forEach(({ elevationFt }, index) => {
    const below = read[index]?.elevationFt ?? -Infinity
    if (elevationFt > below) return
    const message = `The level ${forWords(elevationFt)} ft is not above the level before it, ${forWords(below)} ft; list the levels from the bottom up.`
    throw new EngineeringInputError({ field: `stages[${index + 1}].elevationFt`, message })
  })
  return read
}
