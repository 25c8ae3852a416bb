import { EngineeringInputError } from '../engineering-input-error.js'
import { forWords } from '../for-words.js'

interface SurveyReach {
  /** Where the survey ends (toward water) or begins (toward land). */
  stationFt: number
  neededStationFt: number | undefined
  toward: 'water' | 'land'
}

/** The one sentence for a survey that is too short. */
export function surveyReachError({ stationFt, neededStationFt, toward }: SurveyReach): EngineeringInputError {
  const start = `The survey ${toward === 'water' ? 'ends' : 'begins'} at station ${forWords(stationFt)}`
  const message =
    neededStationFt === undefined
      ? `${start}, and its last slope never meets the earthwork; choose another grade or side slope.`
      : `${start}; it must reach at least station ${forWords(neededStationFt)}.`
  return new EngineeringInputError({ field: 'groundLine', message })
}
