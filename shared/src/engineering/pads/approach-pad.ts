import { fabricTakeOff, type FabricTakeOff } from '../fabric/fabric-take-off.js'
import { requireNumber } from '../require-number.js'
import { requireStoneRates } from '../rock/require-stone-rates.js'
import { stoneQuantity, type StoneQuantity } from '../rock/stone-quantity.js'
import { FT3_PER_YD3 } from '../unit-factors.js'

export interface PadFabric {
  sideTurnUpFt: number
  /** Lap of the pad fabric over the top edge of the ramp fabric, ft. */
  lapDryFt: number
  rollWidthFt: number
  rollLengthFt: number
}

export interface ApproachPadInput {
  lengthFt: number
  widthFt: number
  thicknessIn: number
  unitWeightTonsPerYd3: number
  wastePercent: number
  truckTons?: number
  rampTopStationFt: number
  /** Plumb rock thickness of the ramp at its top, ft (from rampEarthwork). */
  rampVerticalRockThicknessFt: number
  /** Length over which the pad's rock thickens down to the ramp's, ft; 0 leaves the step. */
  thickenAtRampFt?: number
  fabric?: PadFabric
}

export interface ApproachPad extends StoneQuantity {
  areaFt2: number
  fromStationFt: number
  toStationFt: number
  /** Ramp formation below pad formation at the junction, ft; negative where the pad is the thicker. */
  stepToRampFormationFt: number
  thickeningFt3: number
  /** Dug for the pad, bank yd³: pad rock lies flush with the ground. */
  cutYd3: number
  fabric?: FabricTakeOff
}

const DEFAULT_THICKEN_FT = 3

/**
 * Rocked pad from the ramp's top station landward; the ramp owns the station itself. Area = length · width; rock =
 * area · thickness + ½ · step · thickening length · width, where step = ramp's plumb rock thickness − pad's.
 * Pad fabric laps over the ramp fabric's top edge by the dry lap: (length + lap) · (width + 2 · turn-up), no trench.
 *
 * @param input.lengthFt along the approach, ft > 0; input.widthFt ft > 0; input.thicknessIn in > 0; unit weight short
 *   tons per yd³ in place (0–4); wastePercent 0–100; truckTons > 0 if loads are wanted.
 * @param input.rampTopStationFt ft; input.rampVerticalRockThicknessFt ft ≥ 0.
 * @param input.thickenAtRampFt ft, 0 to lengthFt, 3 unless given (or the pad's length if shorter).
 * @returns area (ft²), stations (ft), step (ft), rock (ft³, yd³, tons, order tons, loads), cut (yd³), fabric.
 * @throws EngineeringInputError naming the field.
 * @see common practice, no source.
 * @example approachPad({ lengthFt: 10, widthFt: 18, thicknessIn: 8, unitWeightTonsPerYd3: 1.35, wastePercent: 5,
 *   rampTopStationFt: 43.6, rampVerticalRockThicknessFt: 1.008, thickenAtRampFt: 0 }).tons // 6
 */
export function approachPad(input: ApproachPadInput): ApproachPad {
  const lengthFt = requireNumber({ field: 'lengthFt', value: input.lengthFt, exclusiveMin: 0 })
  const widthFt = requireNumber({ field: 'widthFt', value: input.widthFt, exclusiveMin: 0 })
  const thicknessFt = requireNumber({ field: 'thicknessIn', value: input.thicknessIn, exclusiveMin: 0 }) / 12
  const topStationFt = requireNumber({ field: 'rampTopStationFt', value: input.rampTopStationFt })
  const rampRockFt = requireNumber({
    field: 'rampVerticalRockThicknessFt',
    value: input.rampVerticalRockThicknessFt,
    min: 0,
  })
  const { thickenAtRampFt = Math.min(DEFAULT_THICKEN_FT, lengthFt) } = input
  const thickenFt = requireNumber({ field: 'thickenAtRampFt', value: thickenAtRampFt, min: 0, max: lengthFt })
  const stepFt = rampRockFt - thicknessFt
  const areaFt2 = lengthFt * widthFt
  const thickeningFt3 = (Math.max(0, stepFt) * thickenFt * widthFt) / 2
  const volumeFt3 = areaFt2 * thicknessFt + thickeningFt3
  const fabric = input.fabric ? { fabric: padFabric({ fabric: input.fabric, lengthFt, widthFt }) } : {}
  return {
    areaFt2,
    fromStationFt: topStationFt - lengthFt,
    toStationFt: topStationFt,
    stepToRampFormationFt: stepFt,
    thickeningFt3,
    ...stoneQuantity({ volumeFt3, rates: requireStoneRates({ ...input, prefix: '' }) }),
    cutYd3: volumeFt3 / FT3_PER_YD3,
    ...fabric,
  }
}

function padFabric(given: { fabric: PadFabric; lengthFt: number; widthFt: number }): FabricTakeOff {
  const { fabric, lengthFt, widthFt } = given
  return fabricTakeOff({
    slopeLengthFt: lengthFt,
    wetLengthFt: 0,
    formationWidthFt: widthFt,
    sideTurnUpFt: fabric.sideTurnUpFt,
    topAnchorFt: fabric.lapDryFt,
    toeWrapFt: 0,
    rollWidthFt: fabric.rollWidthFt,
    rollLengthFt: fabric.rollLengthFt,
    lapDryFt: fabric.lapDryFt,
    lapWetFt: fabric.lapDryFt,
  })
}
