import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { DesignPeakInput, DesignPeakResult, PeakMethod, Refused } from './design-peak-types.js'
import { graphicalPeak } from './graphical-peak.js'
import { judgeMethod } from './judge-method.js'
import { rationalAtTime } from './rational-at-time.js'
import { CURVE_NUMBER_RANGE } from './runoff-limits.js'
import { timeOfConcentration } from './time-of-concentration.js'

/**
 * Peak flow for the design: every method asked for is run, a method outside its limits of use is refused by name,
 * and the larger peak of the others is taken. Limits from memory only give a note.
 *
 * @returns designPeakCfs in cfs, the method that governs with the reason, and the working of each method.
 * @throws EngineeringInputError naming the field; naming methods when every method is refused or none is asked for.
 * Source: see `graphicalPeak`, `rationalPeakCfs`, `timeOfConcentration` and `methodLimits`.
 * @example designPeak({ methods: ['graphical'], areaAcres: 1.8, curveNumber: 79, rainfallIn: 4.8, timeOfConcentration: { method: 'given', timeOfConcentrationHr: 0.122 }, distribution: 'II' }).governs // 'graphical'
 */
export function designPeak(input: DesignPeakInput): DesignPeakResult {
  const areaAcres = requireNumber({ field: 'areaAcres', value: input.areaAcres, exclusiveMin: 0, max: 1e6 })
  requireNumber({ field: 'curveNumber', value: input.curveNumber, ...CURVE_NUMBER_RANGE })
  const time = timeOf(input)
  const { timeOfConcentrationHr } = time
  const site = { areaAcres, curveNumber: input.curveNumber, timeOfConcentrationHr }
  const lag = input.timeOfConcentration.method === 'lag' ? input.timeOfConcentration : undefined
  const lagJudged = lag && judgeMethod({ method: 'lag', values: { areaAcres, ...lag }, input })

  const judge = (method: PeakMethod) => {
    if (!input.methods.includes(method)) return undefined
    const judged = judgeMethod({ method, values: site, input })
    return { ...judged, refusal: lagJudged?.refusal ?? judged.refusal }
  }
  const graphicalJudged = judge('graphical')
  const rationalJudged = judge('rational')
  const graphical =
    graphicalJudged &&
    (graphicalJudged.refusal ?? graphicalPeak(graphicalInput(input, timeOfConcentrationHr)))
  const rational =
    rationalJudged &&
    (rationalJudged.refusal ?? rationalAtTime({ areaAcres, timeOfConcentrationHr, rational: input.rational }))

  return {
    timeOfConcentration: time,
    ...(graphical && { graphical }),
    ...(rational && { rational }),
    ...larger({ graphical, rational }),
    notes: [lagJudged, graphicalJudged, rationalJudged, graphical, rational].flatMap(notesOf),
  }
}

function timeOf({ timeOfConcentration: time }: DesignPeakInput) {
  if (time.method !== 'given') return timeOfConcentration(time)
  const { timeOfConcentrationHr: value } = time
  return {
    timeOfConcentrationHr: requireNumber({
      field: 'timeOfConcentrationHr',
      value,
      exclusiveMin: 0,
      max: 1000,
    }),
  }
}

function graphicalInput(input: DesignPeakInput, timeOfConcentrationHr: number) {
  const { areaAcres, curveNumber, rainfallIn, distribution, pondPercent = 0 } = input
  return { areaAcres, curveNumber, rainfallIn, distribution, pondPercent, timeOfConcentrationHr }
}

const notesOf = (part: { notes: string[] } | Refused | undefined): string[] =>
  part && 'notes' in part ? part.notes : []

function larger(results: Record<PeakMethod, { peakCfs: number } | Refused | undefined>) {
  const asked = (['graphical', 'rational'] as const).flatMap((method) => {
    const result = results[method]
    return result ? [{ method, result }] : []
  })
  const peaks = asked.flatMap(({ method, result }) =>
    'refused' in result ? [] : [{ method, peakCfs: result.peakCfs }],
  )
  const [first] = peaks
  if (!first) throw noMethodLeft(asked.flatMap(({ result }) => ('refused' in result ? [result.refused] : [])))
  const largest = peaks.reduce((most, peak) => (peak.peakCfs > most.peakCfs ? peak : most), first)
  return {
    designPeakCfs: largest.peakCfs,
    governs: largest.method,
    reason: reasonFor(largest.method, peaks.length, asked.length),
  }
}

function reasonFor(governs: PeakMethod, used: number, asked: number): string {
  if (used > 1) return `The ${governs} method gives the larger peak and governs.`
  if (asked > 1) return `The ${governs} method governs; the other method is refused.`
  return `Only the ${governs} method was asked for.`
}

const noMethodLeft = (reasons: string[]) =>
  new EngineeringInputError({
    field: 'methods',
    message:
      reasons.length === 0
        ? 'methods is empty; ask for the graphical or the rational method.'
        : `No method can be used. ${[...new Set(reasons)].join(' ')}`,
  })
