import { requireNumber } from '../require-number.js'
import type { SectionTemplate } from './section-areas.js'

export interface EarthworkTemplateInput {
  /** Finished width between the rock's top edges. */
  widthFt: number
  /** Working room beyond the rock, each side. */
  edgeAllowanceFt: number
  edgeRunPerRise?: number
  /** All layers together, square to the slope. */
  rockThicknessIn: number
  cutSideRunPerRise: number
  fillSideRunPerRise: number
  waterSurfaceTodayFt?: number
}

export interface EarthworkTemplate extends SectionTemplate {
  rockThicknessFt: number
}

/** B = widthFt + 2 · edgeRunPerRise · T + 2 · edgeAllowanceFt: the same B for earth, bottom layer and fabric. */
export function earthworkTemplate(input: EarthworkTemplateInput): EarthworkTemplate {
  const atLeastZero = (field: keyof EarthworkTemplateInput, value = input[field]) =>
    requireNumber({ field, value, min: 0 })
  const widthFt = requireNumber({ field: 'widthFt', value: input.widthFt, exclusiveMin: 0 })
  const rockThicknessFt = atLeastZero('rockThicknessIn') / 12
  const edgeAllowanceFt = atLeastZero('edgeAllowanceFt')
  const edgeRunPerRise = atLeastZero('edgeRunPerRise', input.edgeRunPerRise ?? 0)
  const water = input.waterSurfaceTodayFt
  return {
    rockThicknessFt,
    formationWidthFt: widthFt + 2 * edgeRunPerRise * rockThicknessFt + 2 * edgeAllowanceFt,
    cutSideRunPerRise: atLeastZero('cutSideRunPerRise'),
    fillSideRunPerRise: atLeastZero('fillSideRunPerRise'),
    edgeRunPerRise,
    edgeAllowanceFt,
    waterSurfaceFt:
      water === undefined ? -Infinity : requireNumber({ field: 'waterSurfaceTodayFt', value: water }),
  }
}
