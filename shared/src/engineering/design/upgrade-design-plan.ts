import { designPlanSchema, type DesignPlan } from '../../schemas/design-plan.js'

/** From the version named to the next. A plan of the newest version needs no step. */
const steps: { readonly [inputVersion: number]: (plan: object) => object } = {}

const newestVersion = 1

/**
 * Brings a stored plan of any released version to the newest, step by step, and checks it.
 *
 * @throws ZodError for a plan that no released version can have written.
 */
export function upgradeDesignPlan(stored: unknown): DesignPlan {
  let plan = stored
  for (let version = versionOf(stored); version < newestVersion; version += 1) {
    const step = steps[version]
    if (!step || typeof plan !== 'object' || plan === null) break
    plan = step(plan)
  }
  return designPlanSchema.parse(plan)
}

function versionOf(stored: unknown): number {
  if (typeof stored !== 'object' || stored === null || !('inputVersion' in stored)) return newestVersion
  return Number(stored.inputVersion)
}
