import type { DesignPart, DesignPlan } from 'shared'
import { designPlanParts } from './part-catalogue'

/** Storage keeps no order of fields, so two plans are compared without it. */
function inOrder(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(inOrder)
  if (typeof value !== 'object' || value === null) return value
  const entries = Object.entries(value).sort(([one], [other]) => (one < other ? -1 : 1))
  return Object.fromEntries(entries.map(([key, inner]) => [key, inOrder(inner)]))
}

const isSame = (one: unknown, other: unknown): boolean =>
  JSON.stringify(inOrder(one)) === JSON.stringify(inOrder(other))

export const changedParts = (plan: DesignPlan, stored: DesignPlan): DesignPart[] =>
  designPlanParts.filter((part) => !isSame(plan[part], stored[part]))

/** What I changed since `base`, laid over what somebody else saved in between. */
export function mergePlans(mine: DesignPlan, base: DesignPlan, theirs: DesignPlan): DesignPlan {
  const merged = { ...theirs }
  for (const part of changedParts(mine, base)) Object.assign(merged, { [part]: mine[part] })
  return merged
}
