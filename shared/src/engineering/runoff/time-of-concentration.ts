import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { kirpichHr, type KirpichInput } from './kirpich-hr.js'
import { lagHr, type LagInput } from './lag-hr.js'
import { segmentTravelHr } from './segment-travel-hr.js'
import { SHEET_LENGTH_LIMIT_FT, type TravelSegment } from './travel-segment.js'

export interface LagTimeInput extends LagInput {
  method: 'lag'
}

export interface KirpichTimeInput extends KirpichInput {
  method: 'kirpich'
}

export interface SegmentsTimeInput {
  method: 'segments'
  segments: readonly TravelSegment[]
  /** Longest sheet flow allowed, ft, a district setting; 100 unless given. */
  sheetLengthLimitFt?: number
}

export type TimeOfConcentrationInput = LagTimeInput | KirpichTimeInput | SegmentsTimeInput

export interface TimeOfConcentrationResult {
  lagHr?: number
  segmentsHr?: number[]
  timeOfConcentrationHr: number
}

/**
 * Time of concentration Tc with its working: lag L/0.6, Kirpich, or the sum of the travel times of segments.
 * The raw Tc is returned; the peak methods raise it to their own least time and say so.
 *
 * @returns timeOfConcentrationHr in hours, with lagHr or segmentsHr beside it.
 * @throws EngineeringInputError naming the field, or segments when there is none.
 * Source: USDA NRCS, NEH Part 630 ch. 15, May 2010 (lag); TR-55, 2nd ed., June 1986, ch. 3 (segments);
 * Texas Department of Transportation, Hydraulic Design Manual, ch. 4 section 11 (Kirpich).
 * @example timeOfConcentration({ method: 'lag', flowLengthFt: 6900, curveNumber: 75, landSlopePercent: 2.8 }) // lagHr 1.034, Tc 1.723
 */
export function timeOfConcentration(input: TimeOfConcentrationInput): TimeOfConcentrationResult {
  switch (input.method) {
    case 'lag': {
      const lag = lagHr(input)
      return { lagHr: lag, timeOfConcentrationHr: lag / 0.6 }
    }
    case 'kirpich':
      return { timeOfConcentrationHr: kirpichHr(input) }
    case 'segments':
      return sumOfSegments(input)
    default:
      throw new EngineeringInputError({
        field: 'method',
        message: 'method is not known; it must be lag, kirpich or segments.',
      })
  }
}

function sumOfSegments(input: SegmentsTimeInput): TimeOfConcentrationResult {
  if (input.segments.length === 0) {
    throw new EngineeringInputError({
      field: 'segments',
      message: 'segments is empty; give at least one stretch of the flow path.',
    })
  }
  const sheetLengthLimitFt = requireNumber({
    field: 'sheetLengthLimitFt',
    value: input.sheetLengthLimitFt ?? SHEET_LENGTH_LIMIT_FT,
    exclusiveMin: 0,
    max: 1000,
  })
  const segmentsHr = input.segments.map((segment, index) =>
    segmentTravelHr(segment, { at: `segments[${index}]`, sheetLengthLimitFt }),
  )
  return { segmentsHr, timeOfConcentrationHr: segmentsHr.reduce((sum, hours) => sum + hours, 0) }
}
