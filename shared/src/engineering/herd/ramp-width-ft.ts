import { rampWidth, type RampWidthInput } from './ramp-width.js'

/**
 * Least ramp width for a herd: width = base + perHead · head, rounded as the rule says, within its limits.
 *
 * @param input.headCount adult and weaned animals, whole number ≥ 1.
 * @param input.rule baseFt ≥ 0, perHeadFt ≥ 0, rounding, minimumFt > 0, maximumFt ≥ minimumFt (ft); unless given
 *   10 ft + 0.1 ft per head, no rounding, 10 to 80 ft.
 * @returns width, ft.
 * @throws EngineeringInputError naming the field.
 * @see K-State, Livestock Watering Handbook, chapter "Limited Access", undated; rounding is a district setting.
 * @example rampWidthFt({ headCount: 50 }) // 15
 */
export function rampWidthFt(input: RampWidthInput): number {
  return rampWidth(input).widthFt
}
