import { readFileSync } from 'node:fs'
import { publishedCriteria } from '../src/engineering/checks/published-criteria.js'
import { computeDesign } from '../src/engineering/design/compute-design.js'
import { designInput } from '../src/engineering/design/design-input.js'
import { groundLineFromNotes } from '../src/engineering/survey/ground-line-from-notes.js'
import { parseLevelNotesCsv } from '../src/engineering/survey/parse-level-notes-csv.js'
import { reduceLevelNotes } from '../src/engineering/survey/reduce-level-notes.js'
import { sourceFromSchedule } from '../src/money/funding/source-from-schedule.js'
import type { Criterion } from '../src/schemas/criteria.js'
import type { DesignPlan } from '../src/schemas/design-plan.js'
import { exampleJobSchema, type ExampleJob } from '../src/schemas/example-job.js'

const beside = (file: string) => readFileSync(new URL(`./${file}`, import.meta.url), 'utf8')

/** A job file of this folder with the level notes that it names. */
export function readExample(name: string) {
  const example = exampleJobSchema.parse(JSON.parse(beside(`${name}.json`)))
  const { startElevationFt, closing, waterSurfaceFt, notesFile } = example.survey
  const rows = parseLevelNotesCsv({ text: beside(notesFile) })
  const survey = { startElevationFt, waterSurfaceFt, rows, ...(closing ? { closing } : {}) }
  const notes = reduceLevelNotes(survey)
  return { example, rows, notes, groundLine: groundLineFromNotes({ points: notes.points }) }
}

export interface ExampleDesign extends Pick<ReturnType<typeof readExample>, 'example' | 'groundLine'> {
  plan?: DesignPlan
  criteria?: Criterion[]
}

/** Works an example out with its own settings, prices and schedules. */
export function exampleDesign({
  example,
  groundLine,
  plan = example.plan,
  criteria = publishedCriteria,
}: ExampleDesign) {
  const { costList, settings } = example
  const sources = sourcesOf(example, plan)
  return computeDesign(designInput({ plan, groundLine, costList, sources, criteria, settings }))
}

const sourcesOf = ({ schedules }: ExampleJob, plan: DesignPlan) =>
  (plan.funding?.sources ?? []).flatMap((choice) => {
    const schedule = schedules.find(({ key }) => key === choice.scheduleKey)
    return schedule ? [sourceFromSchedule({ schedule, choice })] : []
  })
