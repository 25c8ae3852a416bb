import type { ProfileValue, EarthworkValue } from './ramp-shapes.js'

export type { ProfileValue, EarthworkValue }

export interface HerdValue {
  headCount: number
  /** What the width rule asks for. */
  rampWidthFt: number
  drinkingAtOnce: number
  frontageNeededFt: number
  dailyWater: {
    classes: {
      kind: string
      perHeadGal: number
      totalGal: number
      source: string
      row: string
      extrapolated: boolean
    }[]
    totalGal: number
  }
}

export interface RockLayerValue {
  name: string
  volumeFt3: number
  volumeYd3: number
  tons: number
  orderTons: number
  loads?: number
  topDepthFt: number
  bottomDepthFt: number
}

export interface RockValue {
  layers: RockLayerValue[]
  totalTons: number
  totalOrderTons: number
}

export interface FabricDirection {
  strips: number
  stripLengthFt: number
  grossAreaFt2: number
  lapAreaFt2: number
  trimAreaFt2: number
  joints: { atFt: number; lapFt: number }[]
  piecesPerStrip: number
  rolls: number
}

export interface FabricValue {
  coverWidthFt: number
  coverLengthFt: number
  netAreaFt2: number
  along: FabricDirection
  across: FabricDirection
  recommended: 'along' | 'across'
  reason: string
}

export interface ApproachPadValue {
  lengthFt: number
  widthFt: number
  fromStationFt: number
  toStationFt: number
  areaFt2: number
  rockVolumeYd3: number
  thickeningVolumeYd3: number
  tons: number
  orderTons: number
  cutBankYd3: number
  stepToRampFormationFt: number
  fabricAreaFt2: number
}

export interface ClosingPanelValue {
  lengthFt: number
  deepestWaterFt: number
  heightAtDeepestPostFt: number
  posts: number
}

export interface FenceRunValue {
  name: string
  lengthFt: number
  fencedLengthFt: number
  pullsFt: number[]
  corners: number
  linePosts: number
  inLineBraces: number
  wireFt: number
  hotWireFt: number
}

export interface FenceValue {
  runs: FenceRunValue[]
  setbackFt?: number
  enclosedAreaFt2?: number
  habitatAreaFt2?: number
}

export interface RunoffValue {
  runoffDepthIn: number
  timeOfConcentrationHr: number
  graphicalPeakCfs: number | null
  rationalPeakCfs: number | null
  designPeakCfs: number
  governs: 'graphical' | 'rational'
  notes: string[]
}

export interface BermValue {
  depthFt: number
  capacityVelocityFtPerS: number
  lowResistanceDepthFt: number
  velocityFtPerS: number
  froude: number
  crestAboveChannelFt: number
  settledHeightFt: number
  builtHeightFt: number
  upslopeReachFt: number
  downslopeReachFt: number
  areaFt2: number
  earthYd3PerFt: number
  lengthFt: number
  earthCompactedYd3: number
  earthBankYd3: number
  channelFallFt: number
  footprintFt2: number
}

export interface PondValue {
  storage: { averageEndAreaFt3: number[]; prismoidalFt3: number[] }
  usePerDayFt3: number
  daysOfSupply: number
}

export interface SeedingValue {
  disturbedAreaFt2: number
  acres: number
  mix: { species: string; plsLb: number; bulkLb: number }[]
  mulchTons: number
}
