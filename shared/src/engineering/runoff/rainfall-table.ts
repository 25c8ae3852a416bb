export interface RainfallTable {
  /** Unit of the file; `depthsIn` is in inches either way. */
  units: 'inches' | 'mm'
  series: 'partial-duration' | 'annual-maximum'
  /** Publication, volume and version as the file names them. */
  volume: string
  durationLabels: string[]
  /** Durations in hours, ascending, one per row. */
  durationsHr: number[]
  /** Return periods in years, ascending, one per column. */
  returnPeriodsYr: number[]
  /** Depths in inches: a row per duration, a column per return period. */
  depthsIn: number[][]
  latitude?: number
  longitude?: number
  /** When the file was made, as it says itself. */
  retrieved?: string
}

export interface ReadRainfallTableInput {
  /** Whole text of a point-precipitation frequency file, at most 200,000 characters. */
  text: string
  /** Series the district designs with; partial duration unless given. */
  series?: RainfallTable['series']
}
