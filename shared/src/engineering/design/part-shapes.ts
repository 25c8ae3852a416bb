import type { BermDesignResult } from '../berm/berm-design-types.js'
import type { FabricLayout } from '../fabric/fabric-layout.js'
import type { FabricTakeOff } from '../fabric/fabric-take-off.js'
import type { FenceRunResult, FenceTakeOffResult } from '../fence/fence-result.js'
import type { RockLayer, RockLayers } from '../rock/rock-layers.js'
import type { DesignPeakResult } from '../runoff/design-peak-types.js'
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

export type RockLayerValue = RockLayer
export type RockValue = RockLayers
export type FabricDirection = FabricLayout
export type FabricValue = FabricTakeOff

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

export type FenceRunValue = FenceRunResult
export type FenceValue = FenceTakeOffResult

export interface RunoffValue {
  runoffDepthIn: number
  timeOfConcentrationHr: number
  graphicalPeakCfs: number | null
  rationalPeakCfs: number | null
  designPeakCfs: number
  governs: 'graphical' | 'rational'
  notes: string[]
  /** Each method with its own intermediate figures. */
  methods: DesignPeakResult
}

export type BermValue = BermDesignResult

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
