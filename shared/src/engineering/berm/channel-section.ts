export interface TrapezoidSection {
  shape: 'trapezoid'
  /** Width of the flat bottom, ft, 0 or more. */
  bottomWidthFt: number
  /** Side slopes, run per rise, 0 or more. */
  leftRunPerRise: number
  rightRunPerRise: number
}

export interface TriangleSection {
  shape: 'triangle'
  /** Side slopes, run per rise, 0 or more, not both 0. */
  leftRunPerRise: number
  rightRunPerRise: number
}

export interface ParabolaSection {
  shape: 'parabola'
  /** Width across the top, ft, at depthFt, greater than 0. */
  topWidthFt: number
  /** Depth at the middle, ft, greater than 0; water may stand deeper, on the same curve. */
  depthFt: number
}

export type ChannelSection = TrapezoidSection | TriangleSection | ParabolaSection
