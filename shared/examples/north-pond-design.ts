import { readFileSync } from 'node:fs'
import { computeDesign } from '../src/engineering/design/compute-design.js'
import { designInput } from '../src/engineering/design/design-input.js'
import { groundLineFromNotes } from '../src/engineering/survey/ground-line-from-notes.js'
import { parseLevelNotesCsv } from '../src/engineering/survey/parse-level-notes-csv.js'
import { reduceLevelNotes } from '../src/engineering/survey/reduce-level-notes.js'
import { sourceFromSchedule } from '../src/money/funding/source-from-schedule.js'
import type { Criterion } from '../src/schemas/criteria.js'
import type { DesignPlan } from '../src/schemas/design-plan.js'
import { exampleJobSchema } from '../src/schemas/example-job.js'

const beside = (file: string) => readFileSync(new URL(`./${file}`, import.meta.url), 'utf8')

export const northPond = exampleJobSchema.parse(JSON.parse(beside('north-pond.json')))

const { startElevationFt, closing, waterSurfaceFt, notesFile } = northPond.survey
export const northPondRows = parseLevelNotesCsv({ text: beside(notesFile) })
export const northPondNotes = reduceLevelNotes({
  startElevationFt,
  waterSurfaceFt,
  rows: northPondRows,
  ...(closing ? { closing } : {}),
})
export const northPondGround = groundLineFromNotes({ points: northPondNotes.points })

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
  const sources = (plan.funding?.sources ?? []).flatMap((choice) => {
    const schedule = northPond.schedules.find(({ key }) => key === choice.scheduleKey)
    return schedule ? [sourceFromSchedule({ schedule, choice })] : []
  })
  const { costList, settings } = northPond
  const criteria = northPondCriteria
  const result = computeDesign(
    designInput({ plan, groundLine: northPondGround, costList, sources, criteria, settings }),
  )
  return { plan, result, groundLine: northPondGround }
}
