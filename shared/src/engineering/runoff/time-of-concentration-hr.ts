import { timeOfConcentration, type TimeOfConcentrationInput } from './time-of-concentration.js'

/**
 * Time of concentration alone; `timeOfConcentration` gives the working beside it.
 *
 * @returns Tc in hours, not raised to any method's least time.
 * @throws EngineeringInputError naming the field.
 * Source: see `timeOfConcentration`.
 * @example timeOfConcentrationHr({ method: 'kirpich', flowLengthFt: 1000, slopeFtPerFt: 0.02 }) // 0.1197
 */
export const timeOfConcentrationHr = (input: TimeOfConcentrationInput): number =>
  timeOfConcentration(input).timeOfConcentrationHr
