import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import { exampleJobSchema, readLevelNotesCsv, type ExampleJob, type SurveyInput } from 'shared'

const folder = join(__dirname, '../../../shared/examples')

export interface Example {
  job: ExampleJob
  survey: SurveyInput
}

/** One of the whole jobs that ship with the product, as the tour takes it. */
export function readExample(name: 'north-pond' | 'lower-tank'): Example {
  const job = exampleJobSchema.parse(JSON.parse(readFileSync(join(folder, `${name}.json`), 'utf8')))
  const { notesFile, ...rest } = job.survey
  const { rows } = readLevelNotesCsv({ text: readFileSync(join(folder, notesFile), 'utf8') })
  return { job, survey: { kind: 'level-notes', rows, ...rest } }
}
