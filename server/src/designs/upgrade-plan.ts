import { designPlanSchema, type DesignPlan } from 'shared'

/** A plan of one version, turned into the next. */
type PlanUpgrade = (plan: Record<string, unknown>) => Record<string, unknown>

/** The first entry turns version 1 into version 2, and so on. There has been one version so far. */
const upgrades: readonly PlanUpgrade[] = []

export const planVersion = upgrades.length + 1

/**
 * Opens a plan that any released version stored. What is stored is never rewritten: a plan is upgraded when it is read
 * and stored in its new form when it is next saved.
 *
 * @throws Error when the plan is newer than this server, or was not written by Wadestone at all.
 */
export function upgradePlan(stored: unknown): DesignPlan {
  const plan = requireObject(stored)
  const version = plan['inputVersion']
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    throw new Error('A stored design plan has no input version.')
  }
  if (version > planVersion) {
    throw new Error(`A stored design plan has input version ${version}; this server knows ${planVersion}.`)
  }
  const newest = upgrades.slice(version - 1).reduce((older, upgrade) => upgrade(older), plan)
  return designPlanSchema.parse(newest)
}

function requireObject(stored: unknown): Record<string, unknown> {
  if (typeof stored !== 'object' || stored === null || Array.isArray(stored)) {
    throw new Error('A stored design plan is not an object.')
  }
  return { ...stored }
}
