import { existsSync, readFileSync } from 'node:fs'
import { dirname, join, resolve } from 'node:path'
import { exampleJobSchema } from 'shared'
import { root } from '../system/places.mjs'

function readJson(file) {
  if (!existsSync(file)) throw new Error(`There is no file ${file}.`)
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch (error) {
    throw new Error(`${file} is not JSON: ${error.message}`, { cause: error })
  }
}

/** Reads a job file and the level notes beside it; says of each field that does not fit what would. */
export function readExample({ input, notes }) {
  const file = resolve(input ?? join(root, 'shared/examples/north-pond.json'))
  const parsed = exampleJobSchema.safeParse(readJson(file))
  if (!parsed.success) {
    const lines = parsed.error.issues.map(({ path, message }) => `  ${path.join('.')}: ${message}`)
    throw new Error(`${file} is not a job the tour can take:\n${lines.join('\n')}`)
  }
  const notesFile = resolve(notes ?? join(dirname(file), parsed.data.survey.notesFile))
  if (!existsSync(notesFile)) throw new Error(`There are no level notes at ${notesFile}.`)
  return {
    example: parsed.data,
    notesName: parsed.data.survey.notesFile,
    notesText: readFileSync(notesFile, 'utf8'),
  }
}

/** The plan with one reader's wishes put in. */
export function withChange(plan, { change }) {
  const changed = structuredClone(plan)
  for (const { path, value } of change) {
    const keys = path.split('/').slice(1)
    const last = keys.pop()
    const holder = keys.reduce((node, key) => node?.[key], changed)
    if (holder === undefined || holder === null) throw new Error(`The plan has nothing at ${path}.`)
    holder[last] = value
  }
  return changed
}
