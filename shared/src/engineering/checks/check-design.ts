import type { Criterion } from '../../schemas/criteria.js'
import type { DesignInput } from '../design/design-input.js'
import type { DesignPartResults } from '../design/design-result.js'
import { settingsCatalogue } from '../design/settings-catalogue.js'
import { bermMeasures } from './berm-measures.js'
import { checkFacts, type CheckFacts } from './check-facts.js'
import type { CheckResult, Verdict } from './check-result.js'
import { fenceMeasures } from './fence-measures.js'
import { holds } from './holds.js'
import type { Measured, MeasureTable } from './measure.js'
import { rampMeasures } from './ramp-measures.js'
import { surfaceMeasures } from './surface-measures.js'

/** By the id of the check. A criterion with an id that is not here is shown, but nothing is measured for it. */
export const measures: MeasureTable = {
  ...rampMeasures,
  ...surfaceMeasures,
  ...fenceMeasures,
  ...bermMeasures,
}

export interface CheckDesignInput {
  design: DesignInput
  result: DesignPartResults
  criteria: readonly Criterion[]
}

/**
 * Holds a design against the criteria in force, one result for each. A figure or a limit that is missing makes a check
 * not applicable, never passed. A limit that is only from memory can caution and never fail.
 */
export function checkDesign({ design, result, criteria }: CheckDesignInput): CheckResult[] {
  const facts = checkFacts(design, result)
  return criteria.map((criterion) => checkOne(criterion, facts))
}

function checkOne(criterion: Criterion, facts: CheckFacts): CheckResult {
  const { id, practice, title, comparison, unit, source } = criterion
  const measured = measures[id]?.(facts)
  const limit = limitOf(criterion, measured, facts)
  const judged = judge(criterion, measured, limit)
  const said = [...judged.notes, measured?.note, criterion.note].filter((note) => note !== undefined)
  return {
    id,
    practice,
    title,
    comparison,
    actual: measured?.actual ?? null,
    limit: limit ?? null,
    unit,
    verdict: judged.verdict,
    source,
    note: said.join('; '),
  }
}

type Limit = number | readonly [number, number] | undefined

function limitOf({ limit }: Criterion, measured: Measured | undefined, { setting }: CheckFacts): Limit {
  if (limit === null) return measured?.limit
  if (typeof limit === 'number' || Array.isArray(limit)) return limit
  const key = settingsCatalogue.find((known) => known.key === limit.setting)?.key
  return key === undefined ? undefined : setting(key)
}

function judge(
  criterion: Criterion,
  measured: Measured | undefined,
  limit: Limit,
): { verdict: Verdict; notes: string[] } {
  const { id, comparison, confidence, whenMissed } = criterion
  if (!(id in measures)) return { verdict: 'not-applicable', notes: ['to be looked at by a person'] }
  if (!measured) return { verdict: 'not-applicable', notes: ['not worked out yet'] }
  const { actual } = measured
  if (actual === null)
    return { verdict: measured.cautionWhenUnknown ? 'caution' : 'not-applicable', notes: [] }
  if (comparison !== 'yes' && limit === undefined)
    return { verdict: 'not-applicable', notes: ['limit not set'] }
  if (holds({ comparison, actual, limit })) return { verdict: 'pass', notes: [] }
  if (confidence === 'memory') return { verdict: 'caution', notes: ['from memory, verify'] }
  return { verdict: whenMissed === 'fail' ? 'fail' : 'caution', notes: [] }
}
