import { pondStages, type PondStage } from './pond-stages.js'

export interface PondStorage {
  /** One a stage, cumulative from the lowest, which is 0. */
  averageEndAreaFt3: number[]
  prismoidalFt3: number[]
}

/**
 * Water a pond holds above its lowest stage, by two rules. Average end area: ΔV = h · (A1 + A2)/2. Prismoidal, as the
 * frustum of a pyramid: ΔV = h/3 · (A1 + A2 + √(A1 · A2)).
 *
 * @param input.stages 2 or more, levels strictly ascending: elevationFt ft, areaFt2 water area at that level, ft² ≥ 0.
 * @returns both volumes, ft³, one a stage.
 * @throws EngineeringInputError naming the stage.
 * @see FHWA, HEC-22, 4th ed., February 2024, ch. 10: table 10.4 (average end area), eq. 10.19 (frustum).
 * @example pondStorage({ stages: [{ elevationFt: 278, areaFt2: 0 }, { elevationFt: 279, areaFt2: 490 }] })
 *   .averageEndAreaFt3 // [0, 245]
 */
export function pondStorage({ stages }: { stages: readonly PondStage[] }): PondStorage {
  const checked = pondStages(stages)
  const cumulative = (stepFt3: (heightFt: number, low: number, high: number) => number) =>
    checked.slice(1).reduce(
      (volumes, { elevationFt, areaFt2 }, index) => {
        const below = checked[index] ?? { elevationFt, areaFt2 }
        const step = stepFt3(elevationFt - below.elevationFt, below.areaFt2, areaFt2)
        return [...volumes, (volumes.at(-1) ?? 0) + step]
      },
      [0],
    )
  return {
    averageEndAreaFt3: cumulative((heightFt, low, high) => (heightFt * (low + high)) / 2),
    prismoidalFt3: cumulative((heightFt, low, high) => (heightFt / 3) * (low + high + Math.sqrt(low * high))),
  }
}
