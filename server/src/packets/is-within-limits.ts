import { compareMoney, type ApprovalLimits, type DesignPlan, type DesignResult } from 'shared'
import { fillHeightFt } from './fill-height-ft.js'

interface DesignToCheck {
  plan: DesignPlan
  result: DesignResult
}

/**
 * May a person with these limits check this design? A limit that was never set covers nothing, and neither does one
 * held against a figure that could not be worked out.
 */
export function isWithinLimits(limits: ApprovalLimits | null, { plan, result }: DesignToCheck): boolean {
  const height = fillHeightFt({ plan, result })
  if (limits === null || plan.herd === undefined || !result.cost.ok || height === null) return false
  const drainageAcres = plan.runoff?.areaAcres ?? 0
  return (
    plan.herd.headCount <= limits.maximumHead &&
    drainageAcres <= limits.maximumDrainageAcres &&
    height <= limits.maximumFillHeightFt &&
    compareMoney(result.cost.value.typical, limits.maximumCost) <= 0
  )
}
