import { Problem, type DesignResult, type FieldProblem, type PartResult } from 'shared'
import type { FundingOffer } from './funding-offers.js'
import { emptySettings, emptySettingSentence, noCriteriaSentence } from './missing-rules.js'
import type { RulesInForce } from './rules-in-force.js'

/** `ramp.gradeRunPerRise` and `layers[1].thicknessIn` as a JSON pointer. */
export const pointerOf = (field: string): string =>
  `/${field.replace(/\[(\d+)\]/g, '.$1').replaceAll('.', '/')}`

/** A packet may not be made from a design that misses a figure only the district can give. */
export function refuseEmptySettings(rules: RulesInForce): void {
  const empty = emptySettings(rules)
  if (empty.length === 0) return
  throw new Problem('setting-missing', {
    detail: empty.map(emptySettingSentence).join(' '),
    fields: empty.map((setting) => ({
      pointer: `/settings/${setting.key}`,
      message: emptySettingSentence(setting),
    })),
  })
}

/** Nor from one whose funds cannot be worked out: a payment that nobody mapped would silently be nothing. */
export function refuseUnmapped(offers: readonly FundingOffer[]): void {
  const fields = offers.flatMap((offer, index) => unmappedIn(offer, `/funding/sources/${index}`))
  if (fields.length === 0) return
  throw new Problem('schedule-not-mapped', { detail: fields.map(({ message }) => message).join(' '), fields })
}

function unmappedIn({ choice, schedule, trouble }: FundingOffer, pointer: string): FieldProblem[] {
  if (schedule === null || trouble !== null) {
    return [{ pointer: `${pointer}/scheduleKey`, message: trouble ?? '' }]
  }
  const mapped = new Set(schedule.lines.flatMap(({ quantityKey }) => quantityKey ?? []))
  if (schedule.kind === 'unit-rate' && mapped.size === 0) {
    const message = `No line of ${schedule.name} is mapped to a quantity. The office maps them under Schedules.`
    return [{ pointer: `${pointer}/scheduleKey`, message }]
  }
  const unmapped = Object.keys(choice.contracted ?? {}).filter((key) => !mapped.has(key))
  return unmapped.map((key) => ({
    pointer: `${pointer}/contracted/${key}`,
    message: `The design counts on ${schedule.name} for ${key}, but no line of it is mapped to that quantity. The office maps it under Schedules.`,
  }))
}

/** Nor from one that is not whole: each part that could not be worked out is named. */
export function refuseIncomplete(result: DesignResult, rules: RulesInForce): void {
  const parts = Object.entries(result).filter((entry): entry is [string, PartResult<unknown>] =>
    isPart(entry[1]),
  )
  const failed = parts.flatMap(([, part]) =>
    !part.ok && 'field' in part ? [{ pointer: pointerOf(part.field), message: part.message }] : [],
  )
  const waiting = parts.flatMap(([name, part]) =>
    !part.ok && 'waitingFor' in part
      ? [{ pointer: `/${name}`, message: `This waits for ${part.waitingFor.join(', ')}.` }]
      : [],
  )
  // What waits follows from what failed, so it is named only when nothing else is.
  const fields = [...withoutCriteria(rules), ...(failed.length > 0 ? failed : waiting)]
  if (fields.length === 0) return
  throw new Problem('design-incomplete', { detail: fields.map(({ message }) => message).join(' '), fields })
}

/** Without criteria no check would fail, and so none would hold either. */
const withoutCriteria = ({ criteriaSet }: RulesInForce): FieldProblem[] =>
  criteriaSet === null ? [{ pointer: '/criteria', message: noCriteriaSentence }] : []

const isPart = (value: unknown): value is PartResult<unknown> =>
  typeof value === 'object' && value !== null && 'ok' in value
