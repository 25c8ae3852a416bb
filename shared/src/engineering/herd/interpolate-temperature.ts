import type { TemperatureRow } from './water-tables.js'

export interface TemperatureFigure {
  gallons: number
  extrapolated: boolean
}

/**
 * Gallons at a temperature: straight between the printed ones, the coldest row's figure below it (animals go on
 * drinking in the cold), and the table's last slope above the hottest, marked as extrapolated.
 */
export function interpolateTemperature(row: TemperatureRow, temperatureF: number): TemperatureFigure {
  const { temperaturesF, gallons } = row
  const coldest = gallons[0] ?? 0
  const last = temperaturesF.length - 1
  if (last < 1 || temperatureF <= (temperaturesF[0] ?? Infinity))
    return { gallons: coldest, extrapolated: false }
  const next = temperaturesF.findIndex((printed) => temperatureF <= printed)
  const right = next === -1 ? last : next
  const [t1 = 0, t2 = 1] = [temperaturesF[right - 1], temperaturesF[right]]
  const [g1 = 0, g2 = 0] = [gallons[right - 1], gallons[right]]
  if (temperatureF === t2) return { gallons: g2, extrapolated: false }
  return { gallons: g1 + ((g2 - g1) * (temperatureF - t1)) / (t2 - t1), extrapolated: next === -1 }
}
