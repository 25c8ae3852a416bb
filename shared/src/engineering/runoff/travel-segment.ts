export interface SheetSegment {
  kind: 'sheet'
  /** Length of sheet flow, ft, greater than 0 and at most the sheet limit (100 ft unless set). */
  lengthFt: number
  /** Land slope, ft/ft, greater than 0. */
  slopeFtPerFt: number
  /** Sheet-flow roughness n, 0.005 to 1. */
  roughness: number
  /** 2-year 24-hour rainfall, in, greater than 0. */
  twoYearRainfallIn: number
}

export interface ShallowSegment {
  kind: 'shallow'
  lengthFt: number
  slopeFtPerFt: number
  surface: 'paved' | 'unpaved'
}

export interface ChannelVelocitySegment {
  kind: 'channel'
  lengthFt: number
  /** Mean velocity of the channel when it runs full, ft/s, greater than 0. */
  velocityFtPerS: number
}

export interface ChannelManningSegment {
  kind: 'channel'
  lengthFt: number
  slopeFtPerFt: number
  /** Manning n, 0.005 to 1. */
  roughness: number
  /** Flow area over wetted perimeter, ft, greater than 0. */
  hydraulicRadiusFt: number
}

export type TravelSegment = SheetSegment | ShallowSegment | ChannelVelocitySegment | ChannelManningSegment

/** Longest sheet flow of present NRCS practice, quoted by FHWA HEC-22, 4th ed., Feb 2024, ch. 4. */
export const SHEET_LENGTH_LIMIT_FT = 100
