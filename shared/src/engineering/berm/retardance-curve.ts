export type Retardance = 'A' | 'B' | 'C' | 'D' | 'E'

/** Curve index CI of each retardance class. */
const CURVE_INDEX: Record<Retardance, number> = { A: 10, B: 7.643, C: 5.601, D: 4.436, E: 2.876 }

const HIGHEST_VR = 36

/** From memory, verify: nobody here has read the printed curve. Shown beside every figure that uses it. */
export const RETARDANCE_SOURCE =
  'n–VR curve of USDA ARS Agriculture Handbook 667, Temple and others, 1987: from memory, verify'

/**
 * Manning n of grass at a product VR of velocity and hydraulic radius:
 * n = exp{CI[0.0133 ln²(VR) − 0.0954 ln(VR) + 0.297] − 4.16}, for 0.0025·CI^2.5 < VR < 36 ft²/s.
 * Outside its range VR is held at the end of the range, and `clamped` says so.
 *
 * Source: see RETARDANCE_SOURCE; without a published worked example.
 * @example grassRoughness('D', 1).roughness // 0.0583
 */
export function grassRoughness(
  retardance: Retardance,
  velocityTimesRadius: number,
): { roughness: number; clamped: boolean } {
  const CI = CURVE_INDEX[retardance]
  const lowestVr = 0.0025 * CI ** 2.5
  const held = Math.min(Math.max(velocityTimesRadius, lowestVr), HIGHEST_VR)
  const ln = Math.log(held)
  return {
    roughness: Math.exp(CI * (0.0133 * ln ** 2 - 0.0954 * ln + 0.297) - 4.16),
    clamped: held !== velocityTimesRadius,
  }
}
