import { formatStation } from '../format/format-station.js'

/** Whole feet where the point stands on one, tenths elsewhere. */
export function stationLabel(stationFt: number): string {
  const tenths = Math.round(stationFt * 10)
  return formatStation({ stationFt: tenths / 10, decimals: tenths % 10 === 0 ? 0 : 1 })
}
