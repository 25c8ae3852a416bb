import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import { CURVE_NUMBER_RANGE } from './runoff-limits.js'

export interface CurveNumberPart {
  /** Area of the part, acres, greater than 0. */
  areaAcres: number
  /** Curve number of the part, 30 to 100. */
  curveNumber: number
}

export interface CompositeCurveNumberInput {
  parts: readonly CurveNumberPart[]
}

/**
 * Area-weighted curve number: CN = Σ(A·CN)/ΣA.
 *
 * @returns CN, no unit, between the least and the greatest of the parts.
 * @throws EngineeringInputError naming parts, or parts[i].areaAcres or parts[i].curveNumber.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, ch. 2.
 * @example compositeCurveNumber({ parts: [{ areaAcres: 1, curveNumber: 61 }, { areaAcres: 3, curveNumber: 79 }] }) // 74.5
 */
export function compositeCurveNumber({ parts }: CompositeCurveNumberInput): number {
  if (parts.length === 0) {
    throw new EngineeringInputError({ field: 'parts', message: 'parts is empty; give at least one area.' })
  }
  const checked = parts.map((part, index) => ({
    area: requireNumber({ field: `parts[${index}].areaAcres`, value: part.areaAcres, exclusiveMin: 0 }),
    CN: requireNumber({
      field: `parts[${index}].curveNumber`,
      value: part.curveNumber,
      ...CURVE_NUMBER_RANGE,
    }),
  }))
  const totalArea = checked.reduce((sum, { area }) => sum + area, 0)
  return checked.reduce((sum, { area, CN }) => sum + (area / totalArea) * CN, 0)
}
