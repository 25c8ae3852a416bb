import type { Criterion } from '../src/schemas/criteria.js'
import type { DesignPlan } from '../src/schemas/design-plan.js'
import { exampleDesign, readExample } from './example-design.js'

const read = readExample('north-pond')

export const northPond = read.example
export const northPondRows = read.rows
export const northPondNotes = read.notes
export const northPondGround = read.groundLine

const criterion = (
  id: string,
  title: string,
  rest: Pick<Criterion, 'comparison' | 'limit' | 'unit'>,
): Criterion => ({
  id,
  practice: '561',
  title,
  whenMissed: 'fail',
  source: 'Kansas State University, Livestock Watering Handbook, Limited Access',
  confidence: 'read',
  ...rest,
})

/** A few rules, enough to see each kind of verdict printed. */
export const northPondCriteria: Criterion[] = [
  criterion('grade', 'Steepest grade', { comparison: 'at-least', limit: 6, unit: 'run per rise' }),
  criterion('grade-preferred', 'Grade that stock like', {
    comparison: 'between',
    limit: [8, 20],
    unit: 'run per rise',
  }),
  criterion('drawdown-served', 'Fall of level that is served', {
    comparison: 'at-least',
    limit: 4,
    unit: 'ft',
  }),
]

/** The whole job worked out with its own prices and funds; `change` alters the plan first. */
export function northPondDesign(change: (plan: DesignPlan) => DesignPlan = (plan) => plan) {
  const plan = change(structuredClone(northPond.plan))
  const result = exampleDesign({ ...read, plan, criteria: northPondCriteria })
  return { plan, result, groundLine: northPondGround }
}
