import type { EarthSection } from '../../engineering/design/ramp-shapes.js'
import type { SheetModel } from '../sheet-model.js'
import type { Point } from '../shapes.js'

/** The right half of one section, from the center line outward; the left half is its mirror. */
export interface SectionShape {
  halfRock: (depthFt: number) => number
  halfFormation: number
  /** Where the dug or filled side meets the existing ground. */
  halfReach: number
  /** Height to which earth is put back beside the rock. */
  backfillFt: number
  halfBackfill: number
  plumb: number
  thicknessFt: number
}

export function sectionShape(model: SheetModel, section: EarthSection): SectionShape {
  const { earthwork, ramp, edgeRunPerRise, layers } = model
  const formation = earthwork?.formationWidthFt ?? ramp.widthFt
  const cut = earthwork?.cutSideRunPerRise ?? 0
  const fill = earthwork?.fillSideRunPerRise ?? 0
  const thicknessFt = layers.at(-1)?.bottomFt ?? 0
  const depth = section.groundFt - section.formationFt
  const backfillFt = Math.min(section.groundFt, section.finishedFt)
  return {
    halfRock: (depthFt) => ramp.widthFt / 2 + edgeRunPerRise * depthFt,
    halfFormation: formation / 2,
    halfReach: formation / 2 + (depth > 0 ? cut * depth : -fill * depth),
    backfillFt,
    halfBackfill: formation / 2 + cut * Math.max(0, backfillFt - section.formationFt),
    plumb: thicknessFt > 0 ? (section.finishedFt - section.formationFt) / thicknessFt : 1,
    thicknessFt,
  }
}

export const mirrored = (half: readonly Point[]): Point[] => [
  ...[...half].reverse().map(({ x, y }) => ({ x: -x, y })),
  ...half,
]

/** The line of what stands when the work is done, right half, from the center line out. */
export function finishedHalf(model: SheetModel, section: EarthSection): Point[] {
  const shape = sectionShape(model, section)
  const { finishedFt, formationFt, groundFt } = section
  const edge = { x: shape.halfRock(0), y: finishedFt }
  if (groundFt <= formationFt) {
    return [edge, { x: shape.halfFormation, y: formationFt }, { x: shape.halfReach, y: groundFt }]
  }
  const depthAtBackfill = (finishedFt - shape.backfillFt) / shape.plumb
  const beside = { x: shape.halfRock(Math.max(0, depthAtBackfill)), y: shape.backfillFt }
  return [edge, beside, { x: shape.halfBackfill, y: shape.backfillFt }, { x: shape.halfReach, y: groundFt }]
}
