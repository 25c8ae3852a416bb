import { readFileSync } from 'node:fs'
import { join } from 'node:path'
import type { DesignPlan, ExampleJob } from 'shared'
import { exampleDesign, readExample } from '../../../shared/examples/example-design'

const { example, groundLine, rows } = readExample('north-pond')

export const northPond = example
export const northPondRows = rows

const folder = join(import.meta.dirname, '..', '..', '..', 'shared', 'examples')
export const northPondNotesFile = join(folder, northPond.survey.notesFile)
export const northPondNotesText = (): string => readFileSync(northPondNotesFile, 'utf8')

/** What the pages must show of a plan, worked out apart from the running product with the prices of the file. */
export const expectedDesign = (plan: DesignPlan) => exampleDesign({ example, groundLine, plan })

/** The plan with what a reader asked for put in. */
export function withChange(plan: DesignPlan, { change }: ExampleJob['landownerAsks']): DesignPlan {
  const changed = structuredClone(plan)
  for (const { path, value } of change) {
    const keys = path.split('/').slice(1)
    const last = keys.pop() ?? ''
    let holder = changed as unknown as Record<string, unknown>
    for (const key of keys) holder = holder[key] as Record<string, unknown>
    holder[last] = value
  }
  return changed
}
