import { requireNumber } from '../require-number.js'

/** TR-55, 2nd ed., June 1986, ch. 4: [percent of the area in ponds and swamps, Fp]. */
const ROWS = [
  [0, 1],
  [0.2, 0.97],
  [1, 0.87],
  [3, 0.75],
  [5, 0.72],
] as const

/**
 * Factor for ponds and swamps spread over the drainage area and not in the flow path, linear between table rows.
 *
 * @param pondPercent share of the area, percent, 0 to 100; 5 and more give the last row.
 * @returns Fp, no unit, 0.72 to 1.
 * @throws EngineeringInputError naming pondPercent.
 * Source: USDA NRCS, TR-55, Urban Hydrology for Small Watersheds, 2nd ed., June 1986, ch. 4.
 * @example pondFactor(3) // 0.75
 */
export function pondFactor(pondPercent: number): number {
  const percent = requireNumber({ field: 'pondPercent', value: pondPercent, min: 0, max: 100 })
  const above = ROWS.findIndex(([share]) => share >= percent)
  const upper = ROWS[above]
  if (!upper) return 0.72
  const lower = ROWS[above - 1] ?? upper
  if (upper[0] === lower[0]) return upper[1]
  return lower[1] + ((percent - lower[0]) / (upper[0] - lower[0])) * (upper[1] - lower[1])
}
