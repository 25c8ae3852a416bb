import type { RainfallTable } from './rainfall-table.js'
import { refuseText } from './refuse-text.js'

export type RainfallHeader = Pick<RainfallTable, 'units' | 'series' | 'volume' | 'latitude' | 'longitude'>

const MM_WORDS = ['mm', 'millimeter', 'millimeters', 'millimetres']

/**
 * What the lines above the table say. The unit stands only in the parenthesis of the first line.
 *
 * @param lines every line above the table, cells joined again by commas.
 * @throws EngineeringInputError naming text for a file of intensities, an unknown unit or a missing line.
 * Source: layout of NOAA Atlas 14 point precipitation files, Precipitation Frequency Data Server.
 * @example rainfallHeader(['Point precipitation frequency estimates (inches)', 'NOAA Atlas 14 Volume 9 Version 2', 'Time series type: Partial duration'])
 */
export function rainfallHeader(lines: readonly string[]): RainfallHeader {
  const dataType = after(lines, 'Data type')
  const unit =
    /\(([^)]*)\)/
      .exec(lines[0] ?? '')?.[1]
      ?.trim()
      .toLowerCase() ?? ''
  if (/intensity/i.test(dataType ?? '') || unit.includes('/')) {
    refuseText('This file holds rainfall intensities; give the file of rainfall depths.')
  }
  const units = unit === 'inches' ? 'inches' : MM_WORDS.includes(unit) ? 'mm' : undefined
  if (!units) refuseText('The first line must name the unit in brackets: (inches) or (millimeters).')
  const series = after(lines, 'Time series type') ?? ''
  const latitude = degrees(after(lines, 'Latitude'))
  const longitude = degrees(after(lines, 'Longitude'))
  return {
    units,
    series: /annual/i.test(series) ? 'annual-maximum' : 'partial-duration',
    volume: lines.find((line) => /volume|atlas/i.test(line))?.trim() ?? 'not named in the file',
    ...(latitude === undefined ? {} : { latitude }),
    ...(longitude === undefined ? {} : { longitude }),
  }
}

const after = (lines: readonly string[], name: string): string | undefined => {
  const line = lines.find((candidate) => candidate.trim().toLowerCase().startsWith(`${name.toLowerCase()}:`))
  return line?.slice(line.indexOf(':') + 1).trim()
}

const degrees = (text: string | undefined): number | undefined => {
  const value = Number.parseFloat(text ?? '')
  return Number.isFinite(value) ? value : undefined
}
