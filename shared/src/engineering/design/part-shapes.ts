import type { BermDesignResult } from '../berm/berm-design-types.js'
import type { FabricLayout } from '../fabric/fabric-layout.js'
import type { FabricTakeOff } from '../fabric/fabric-take-off.js'
import type { FenceRunResult, FenceTakeOffResult } from '../fence/fence-result.js'
import type { SupplyStep } from '../pond/days-of-supply.js'
import type { PondStorage } from '../pond/pond-storage.js'
import type { RockLayer, RockLayers } from '../rock/rock-layers.js'
import type { DesignPeakResult } from '../runoff/design-peak-types.js'
import type { SeedingPlan } from '../seeding/seeding-plan.js'
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
  storage: PondStorage
  /** From full pool down to the level at which the ramp still gives the drinking depth. */
  fromElevationFt: number
  toElevationFt: number
  usableFt3: number
  usePerDayFt3: number
  daysOfSupply: number
  /** From the water as it stood on the day of the survey, down to the same level. */
  daysFromToday: number
  steps: SupplyStep[]
}

export interface SeedingValue extends SeedingPlan {
  /** Cut and fill sides above the water; the rest is the berm and what the planner added. */
  sideSlopesFt2: number
}
