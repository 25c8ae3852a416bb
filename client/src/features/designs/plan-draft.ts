import { designPlanSchema, type DesignPart, type DesignPlan } from 'shared'
import { withoutEmpty } from '../../components/fields/without-empty'
import { designPlanParts } from './part-catalogue'

/** A plan as it is typed: figures that cannot be read stay as they are, emptied fields are null. */
export type PlanDraft = Record<string, unknown>

type Branch = Record<string, unknown>

export const planDraft = (plan: DesignPlan): PlanDraft => structuredClone(plan) as PlanDraft

const without = (part: Branch, name: string, isNothing: boolean): Branch =>
  isNothing ? Object.fromEntries(Object.entries(part).filter(([key]) => key !== name)) : part

const isEmptyList = (value: unknown): boolean => Array.isArray(value) && value.length === 0

/** Kinds of wire that the runs name, and netting where one is woven; rolls of others are left over from before. */
export function wireKindsOf(fence: unknown): string[] {
  const runs = (fence as { runs?: unknown } | null | undefined)?.runs
  const kinds = (Array.isArray(runs) ? runs : []).flatMap((run: Branch | null) => [
    ...(typeof run?.wireKind === 'string' ? [run.wireKind.trim()] : []),
    ...(run?.fence === 'woven' ? ['netting'] : []),
  ])
  return [...new Set(kinds.filter((kind) => kind !== ''))]
}

function rollsInUse(fence: Branch): Branch {
  const kinds = wireKindsOf(fence)
  const lengths = Object.entries((fence.rollLengthFt ?? {}) as Branch).filter(([kind]) =>
    kinds.includes(kind),
  )
  return { ...fence, rollLengthFt: Object.fromEntries(lengths) }
}

/** Lists and records that a plan leaves out rather than keeps empty. */
const tidy: Partial<Record<DesignPart, (part: Branch) => Branch>> = {
  site: (site) => without(site, 'waterOutline', isEmptyList(site.waterOutline)),
  fence: (fence) => without(rollsInUse(fence), 'nodes', isEmptyList(fence.nodes)),
  funding: (funding) => ({
    ...funding,
    sources: ((funding.sources ?? []) as Branch[]).map((source) =>
      without(source, 'contracted', Object.keys((source.contracted ?? {}) as Branch).length === 0),
    ),
  }),
}

/** One part as it would be sent; undefined when nobody has begun it. */
export function readPart(part: DesignPart, typed: unknown): unknown {
  if (typed === undefined || typed === null) return undefined
  const value = withoutEmpty(typed) as Branch
  return tidy[part]?.(value) ?? value
}

export interface Savable {
  /** Every part that is complete as typed, else as it is stored, else left out. */
  plan: DesignPlan
  /** Parts that are begun but cannot be saved yet; they stay on the page. */
  unfinished: DesignPart[]
}

/** A part that is half filled in does not keep the others from being saved. */
export function savablePlan(draft: PlanDraft, stored: DesignPlan): Savable {
  const unfinished: DesignPart[] = []
  const parts = designPlanParts.flatMap((part): [DesignPart, unknown][] => {
    const parsed = designPlanSchema.shape[part].safeParse(readPart(part, draft[part]))
    if (parsed.success) return parsed.data === undefined ? [] : [[part, parsed.data]]
    unfinished.push(part)
    return stored[part] === undefined ? [] : [[part, stored[part]]]
  })
  return { plan: { inputVersion: 1, ...(Object.fromEntries(parts) as Partial<DesignPlan>) }, unfinished }
}
