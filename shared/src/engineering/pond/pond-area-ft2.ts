import type { PondStage } from './pond-stages.js'

/** Water area at a level within the stages, straight between the two nearest. */
export function pondAreaFt2(stages: readonly PondStage[], elevationFt: number): number {
  const above = stages.find((stage) => stage.elevationFt >= elevationFt) ?? stages.at(-1)
  const below = stages.findLast((stage) => stage.elevationFt <= elevationFt) ?? stages[0]
  if (!above || !below) return 0
  const heightFt = above.elevationFt - below.elevationFt
  if (heightFt <= 0) return above.areaFt2
  return below.areaFt2 + ((above.areaFt2 - below.areaFt2) * (elevationFt - below.elevationFt)) / heightFt
}
