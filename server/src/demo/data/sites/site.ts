import type { DesignPlan, SurveyInput } from 'shared'

/** What tells one example job from another on ground of the same kind. */
export interface SiteChoice {
  /** Elevation of the full pool or of the ordinary level, ft. */
  levelFt: number
  headCount: number
  widthFt: number
  gradeRunPerRise: number
  funding: DesignPlan['funding']
}

export interface DemoSite {
  survey: SurveyInput
  plan: DesignPlan
}

/** Elevations come out of sums; a hundredth of a foot is what the rod was read to. */
export const atLevel = (levelFt: number, aboveFt: number): number =>
  Math.round((levelFt + aboveFt) * 100) / 100
