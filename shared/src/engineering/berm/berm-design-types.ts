import type { ChannelSection } from './channel-section.js'
import type { Retardance } from './retardance-curve.js'
import type { RidgeSectionResult } from './ridge-section.js'

export type BermSide = 'left' | 'right'

/** A fixed Manning n, or grass of a retardance class. */
export type BermResistance = { roughness: number } | { retardance: Retardance }

/** A channel dug along the upslope foot, with its depth below the ground. */
export type CutChannel = ChannelSection & { cutDepthFt: number }

export interface BermOutlet {
  side: BermSide
  surface: string
  distanceToRampFt: number
  stable: boolean
}

export interface BermCrossing {
  /** Length along the berm that cattle cross, ft, greater than 0. */
  lengthFt: number
  /** Side slopes of the berm there, run per rise; 8 unless given. */
  sideRunPerRise?: number
}

export interface BermDesignInput {
  /** Design flow, cfs, 0 or more. */
  flowCfs: number
  /** Grade of the channel along the berm, ft/ft, greater than 0 and at most 1. */
  channelGradeFtPerFt: number
  /** Fall of the ground across the berm, ft/ft, 0 to 1. */
  groundFallFtPerFt: number
  /** Faces of the ridge, run per rise, 0 to 100. */
  upslopeRunPerRise: number
  downslopeRunPerRise: number
  topWidthFt: number
  cutChannel?: CutChannel
  /** Highest resistance expected, for capacity; lowest, for velocity. */
  resistanceHigh: BermResistance
  resistanceLow: BermResistance
  freeboardFt: number
  /** Least height of the crest above the bottom of the channel, ft, 0 or more. */
  minimumHeightFt: number
  settlementPercent: number
  rampWidthFt: number
  /** Reach of the ramp's cut slopes beyond its width, each side, ft. */
  rampEdgeCutFt: number
  /** Reach of the berm past those edges, ft. */
  pastEdgeFt: Record<BermSide, number>
  /** Side to which the channel runs; 'both' runs from a crown at the middle of the ramp. */
  falls: BermSide | 'both'
  outlets: readonly BermOutlet[]
  crossing?: BermCrossing
  /** Loss of volume from bank to compacted earth, percent, 0 to below 100; 0 unless given. */
  shrinkPercent?: number
}

export interface BermEnd {
  side: BermSide
  pastEdgeFt: number
  /** The channel runs out here; otherwise this end stands high. */
  isOutlet: boolean
  /** Length of channel that runs to this end, ft, and its flow and fall; 0 at a high end. */
  armLengthFt: number
  armFlowCfs: number
  armFallFt: number
  outlet?: BermOutlet
}

export interface BermDesignResult {
  /** Channel that carries the water: cut, or ridge face and natural ground; absent when there is no flow. */
  channel?: ChannelSection
  /** Flow of the larger arm, cfs. */
  armFlowCfs: number
  depthFt: number
  capacityVelocityFtPerS: number
  lowResistanceDepthFt: number
  velocityFtPerS: number
  froude: number
  crestAboveChannelFt: number
  heightGovernedBy: 'depth and freeboard' | 'minimum height'
  settledHeightFt: number
  builtHeightFt: number
  upslopeReachFt: number
  downslopeReachFt: number
  baseWidthFt: number
  /** From the middle of the crest to the downslope foot, the widest along the berm, ft. */
  downslopeFootFromCentreFt: number
  areaFt2: number
  earthYd3PerFt: number
  lengthFt: number
  earthCompactedYd3: number
  /** Bank earth to bring after what the channel itself gives, yd³. */
  earthBankYd3: number
  channelCutYd3: number
  /** Fall of the longer arm, ft. */
  channelFallFt: number
  footprintFt2: number
  ends: BermEnd[]
  crossing?: RidgeSectionResult & { lengthFt: number }
  notes: string[]
}
