import type { DesignPlan, DesignResult } from 'shared'

interface DesignOfEarth {
  plan: DesignPlan
  result: DesignResult
}

/** The highest earth the design heaps up, ft: the berm as built or fill under the ramp. Null when it is not worked out. */
export function fillHeightFt({ plan, result }: DesignOfEarth): number | null {
  if (!result.earthwork.ok || (plan.berm !== undefined && !result.berm.ok)) return null
  const underRamp = result.earthwork.value.sections.map(({ formationFt, groundFt }) => formationFt - groundFt)
  const ofBerm = plan.berm !== undefined && result.berm.ok ? [result.berm.value.builtHeightFt] : []
  return Math.max(0, ...underRamp, ...ofBerm)
}
