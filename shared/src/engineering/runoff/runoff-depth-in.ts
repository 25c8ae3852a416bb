import { requireNumber } from '../require-number.js'
import { potentialRetentionIn } from './potential-retention-in.js'
import { CURVE_NUMBER_RANGE, RAINFALL_RANGE_IN } from './runoff-limits.js'

export interface RunoffDepthInput {
  /** Storm rainfall P, in, 0 to 100. */
  rainfallIn: number
  /** Curve number CN, 30 to 100. */
  curveNumber: number
}

/**
 * Depth of runoff from a storm: Q = (P − 0.2S)²/(P + 0.8S) when P > 0.2S, else 0; S = 1000/CN − 10.
 *
 * @returns Q in inches over the drainage area.
 * @throws EngineeringInputError naming rainfallIn or curveNumber.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, eqs 2-1 to 2-4.
 * @example runoffDepthIn({ rainfallIn: 6, curveNumber: 75 }) // 3.2821
 */
export function runoffDepthIn(input: RunoffDepthInput): number {
  const P = requireNumber({ field: 'rainfallIn', value: input.rainfallIn, ...RAINFALL_RANGE_IN })
  const CN = requireNumber({ field: 'curveNumber', value: input.curveNumber, ...CURVE_NUMBER_RANGE })
  const S = potentialRetentionIn(CN)
  const initialAbstraction = 0.2 * S
  if (P <= initialAbstraction) return 0
  return (P - initialAbstraction) ** 2 / (P + 0.8 * S)
}
