import { costEstimate } from '../../money/cost-estimate.js'
import { fundingStack } from '../../money/funding/funding-stack.js'
import { checkDesign } from '../checks/check-design.js'
import { askOf, type Ask } from './ask.js'
import { attempt } from './attempt.js'
import { billOfQuantities } from './bill-of-quantities.js'
import { CALCULATION_VERSION } from './calculation-version.js'
import type { DesignInput } from './design-input.js'
import { designParts, type DesignPartName } from './design-parts.js'
import type { DesignPartResults, DesignResult, PartValues } from './design-result.js'
import { fieldPath } from './field-path.js'
import { NotReady } from './not-ready.js'
import type { PartResult } from './part-result.js'
import { recipes } from './recipes/recipes.js'
import { soundPlan, type SoundPlan } from './sound-plan.js'
import { workingFigures } from './working/working-figures.js'

/**
 * Works out a whole design: every part, then quantities, cost, funding, checks and the working. Pure: the same input
 * gives the same result, with no clock and nothing read or written. A part whose input is missing or wrong says so in
 * its own place; parts that need it wait, and all others stand.
 *
 * @returns every part as ready, failed or waiting; checks and working of what is ready.
 * @example computeDesign(designInput({ plan, groundLine, costList, sources, criteria, settings })).cost
 */
export function computeDesign(input: DesignInput): DesignResult {
  const plan = soundPlan(input)
  const parts = partResults(plan)
  const ask = askOf(plan, parts)
  const quantities = attempt(
    () => quantitiesOf(ask, parts),
    (field) => `quantities.${field}`,
  )
  const cost = attempt(
    () => costOf(input, quantities),
    (field) => field,
  )
  const funding = attempt(
    () => fundingOf(ask, quantities, cost),
    (field) => `sources.${field}`,
  )
  return {
    ...parts,
    quantities,
    cost,
    funding,
    checks: checkDesign({ design: plan.sound, result: parts, criteria: input.criteria }),
    working: workingFigures(ask),
    calculationVersion: CALCULATION_VERSION,
  }
}

/** A recipe sees what is done before it, so the order is that of need. */
function partResults(plan: SoundPlan): DesignPartResults {
  const done: Partial<DesignPartResults> = {}
  for (const part of inOrderOfNeed) workOut(part, plan, done)
  return done as DesignPartResults
}

/** Earthwork counts the pad's cut, so the pad goes first; all else stands in the order in which it is shown. */
const inOrderOfNeed: readonly DesignPartName[] = [
  'herd',
  'profile',
  'approachPad',
  ...designParts.filter((part) => !['herd', 'profile', 'approachPad'].includes(part)),
]

function workOut<Part extends DesignPartName>(
  part: Part,
  plan: SoundPlan,
  done: Partial<DesignPartResults>,
): void {
  const result: PartResult<PartValues[Part]> = attempt(
    () => recipes[part](askOf(plan, done)),
    (field) => fieldPath(part, field),
  )
  done[part] = result as DesignPartResults[Part]
}

const billedParts = [
  'earthwork',
  'rock',
  'fabric',
  'approachPad',
  'closingPanel',
  'fence',
  'berm',
  'seeding',
] as const satisfies readonly DesignPartName[]

function quantitiesOf(ask: Ask, parts: DesignPartResults) {
  const waitingFor = billedParts.filter((part) => !parts[part].ok)
  if (waitingFor.length > 0) throw new NotReady({ ok: false, waitingFor })
  const values = {
    earthwork: ask.part('earthwork'),
    rock: ask.part('rock'),
    fabric: ask.part('fabric'),
    approachPad: ask.part('approachPad'),
    closingPanel: ask.part('closingPanel'),
    fence: ask.part('fence'),
    berm: ask.part('berm'),
    seeding: ask.part('seeding'),
  }
  return billOfQuantities({ plan: { rock: ask.plan('rock'), fence: ask.plan('fence') }, parts: values })
}

function costOf({ costList }: DesignInput, quantities: DesignResult['quantities']) {
  if (!quantities.ok) throw new NotReady({ ok: false, waitingFor: ['quantities'] })
  if (costList === null) {
    const message = 'No cost list is in force. The office can put one in force under Costs.'
    throw new NotReady({ ok: false, field: 'costList', message })
  }
  return costEstimate({ lines: quantities.value, costList })
}

function fundingOf(ask: Ask, quantities: DesignResult['quantities'], cost: DesignResult['cost']) {
  if (!quantities.ok || !cost.ok) throw new NotReady({ ok: false, waitingFor: ['cost'] })
  const { lines, typical } = cost.value
  return fundingStack({
    lines: quantities.value,
    cost: { lines: lines.map(({ key, typical: amount }) => ({ key, amount })), total: typical },
    sources: ask.input.sources,
    stackLimitPercent: ask.settingIfEntered('stackLimitPercent') ?? 100,
    stackScope: ask.input.stackScope ?? 'job',
  })
}
