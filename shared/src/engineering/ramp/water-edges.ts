import type { RampLevels } from './ramp-levels.js'

export interface WaterEdges {
  /** Where each level meets the finished surface. */
  fullPoolEdgeStationFt: number
  lowWaterEdgeStationFt: number
  /** Absent when today's water stands off the slope, above its top or below its toe. */
  waterTodayEdgeStationFt?: number
  wetRunAtFullFt: number
  wetRunAtLowFt: number
  wetSlopeLengthAtFullFt: number
  wetSlopeLengthAtLowFt: number
  wetSlopeLengthTodayFt?: number
}

interface WaterEdgesInput {
  levels: RampLevels
  topStationFt: number
  toeStationFt: number
  endStationFt: number
  gradeRunPerRise: number
}

/** Water edges on the finished surface, and the wetted length below each, the apron included. */
export function waterEdges(input: WaterEdgesInput): WaterEdges {
  const { levels, toeStationFt, endStationFt } = input
  const apronFt = endStationFt - toeStationFt
  const slopePerRun = Math.hypot(1, 1 / input.gradeRunPerRise)
  const edge = (levelFt: number) =>
    input.topStationFt + (levels.topElevationFt - levelFt) * input.gradeRunPerRise
  const wetSlope = (edgeStationFt: number) => (toeStationFt - edgeStationFt) * slopePerRun + apronFt
  const full = edge(levels.fullPoolElevationFt)
  const low = edge(levels.lowWaterElevationFt)
  return {
    fullPoolEdgeStationFt: full,
    lowWaterEdgeStationFt: low,
    wetRunAtFullFt: endStationFt - full,
    wetRunAtLowFt: endStationFt - low,
    wetSlopeLengthAtFullFt: wetSlope(full),
    wetSlopeLengthAtLowFt: wetSlope(low),
    ...today({ levels, edge, wetSlope, topStationFt: input.topStationFt }),
  }
}

interface TodayInput {
  levels: RampLevels
  edge: (levelFt: number) => number
  wetSlope: (edgeStationFt: number) => number
  topStationFt: number
}

function today({ levels, edge, wetSlope, topStationFt }: TodayInput): Partial<WaterEdges> {
  const waterFt = levels.waterSurfaceTodayFt
  if (waterFt === undefined) return {}
  if (waterFt <= levels.toeElevationFt) return { wetSlopeLengthTodayFt: 0 }
  if (waterFt > levels.topElevationFt) return { wetSlopeLengthTodayFt: wetSlope(topStationFt) }
  const waterTodayEdgeStationFt = edge(waterFt)
  return { waterTodayEdgeStationFt, wetSlopeLengthTodayFt: wetSlope(waterTodayEdgeStationFt) }
}
