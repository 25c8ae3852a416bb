export type RampPart = 'approach' | 'landing' | 'ramp' | 'apron' | 'nose' | 'end-cut'

export interface ProfileValue {
  topElevationFt: number
  toeElevationFt: number
  toeGovernedBy: string
  topStationFt: number
  toeStationFt: number
  riseFt: number
  runFt: number
  slopeLengthFt: number
  gradePercent: number
  gradeDegrees: number
  surface: { stationFt: number; elevationFt: number; part: RampPart }[]
  fullPoolEdgeStationFt: number
  lowWaterEdgeStationFt: number
  waterTodayEdgeStationFt?: number
  wetRunAtFullFt: number
  wetRunAtLowFt: number
  wetSlopeLengthAtFullFt: number
  wetSlopeLengthAtLowFt: number
  wetSlopeLengthTodayFt?: number
  drawdownServedFt: number
  groundAtTopFt: number
  groundAtToeFt: number
  bankCase: 'cut' | 'fill' | 'mixed'
  balancedTopStationFt?: number
}

export interface EarthSection {
  stationFt: number
  part: RampPart
  groundFt: number
  finishedFt: number
  formationFt: number
  cutAreaFt2: number
  fillAreaFt2: number
  wetCutAreaFt2: number
  wetFillAreaFt2: number
  edgeBackfillAreaFt2: number
}

export interface EarthVolumes {
  cutYd3: number
  fillYd3: number
  wetCutYd3: number
  dryCutYd3: number
  wetFillYd3: number
  edgeBackfillYd3: number
}

export interface EarthworkValue {
  formationWidthFt: number
  verticalRockThicknessFt: number
  sections: EarthSection[]
  averageEndArea: EarthVolumes
  prismoidal: EarthVolumes
}
