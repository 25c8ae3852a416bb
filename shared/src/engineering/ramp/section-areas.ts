/** Shape of the earthwork across the ramp. */
export interface SectionTemplate {
  /** Width of the formation, B, ft. */
  formationWidthFt: number
  cutSideRunPerRise: number
  fillSideRunPerRise: number
  edgeRunPerRise: number
  edgeAllowanceFt: number
  /** Level expected while building; -Infinity when the pond is dry or not stated. */
  waterSurfaceFt: number
}

export interface SectionAreas {
  cutAreaFt2: number
  fillAreaFt2: number
  wetCutAreaFt2: number
  wetFillAreaFt2: number
  edgeBackfillAreaFt2: number
}

interface SectionInput {
  groundFt: number
  formationFt: number
  /** Rock measured plumb, ft; 0 where there is none. */
  rockFt: number
  template: SectionTemplate
}

const NONE: SectionAreas = {
  cutAreaFt2: 0,
  fillAreaFt2: 0,
  wetCutAreaFt2: 0,
  wetFillAreaFt2: 0,
  edgeBackfillAreaFt2: 0,
}

const trapezoid = (widthFt: number, runPerRise: number, heightFt: number) =>
  widthFt * heightFt + runPerRise * heightFt ** 2

/**
 * Areas of one cross section, ground taken level across. With d = ground − formation: cut = B·d + s_c·d²; of it wet up
 * to the water. Fill = B·h + s_f·h², h = −d; of it wet what lies below the water. Between the rock's edge and the cut
 * side earth goes back: (s_c + e)·m² + 2·allowance·m, m = min(d, rock).
 */
export function sectionAreas({ groundFt, formationFt, rockFt, template }: SectionInput): SectionAreas {
  const {
    formationWidthFt: width,
    waterSurfaceFt,
    cutSideRunPerRise: cutSide,
    fillSideRunPerRise: fillSide,
  } = template
  const depth = groundFt - formationFt
  if (depth > 0) {
    const wetDepth = Math.min(Math.max(waterSurfaceFt - formationFt, 0), depth)
    const backfilled = Math.min(depth, rockFt)
    return {
      ...NONE,
      cutAreaFt2: trapezoid(width, cutSide, depth),
      wetCutAreaFt2: trapezoid(width, cutSide, wetDepth),
      edgeBackfillAreaFt2: trapezoid(
        2 * template.edgeAllowanceFt,
        cutSide + template.edgeRunPerRise,
        backfilled,
      ),
    }
  }
  const height = -depth
  const wetHeight = Math.min(Math.max(waterSurfaceFt - groundFt, 0), height)
  const widthAtWater = width + 2 * fillSide * (height - wetHeight)
  return {
    ...NONE,
    fillAreaFt2: trapezoid(width, fillSide, height),
    wetFillAreaFt2: trapezoid(widthAtWater, fillSide, wetHeight),
  }
}
