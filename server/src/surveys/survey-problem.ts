import { EngineeringInputError, Problem, type SurveyInput } from 'shared'

/** The formulas call the points of a ground line by their own name; the form knows them by the body's. */
const bodyField: Record<SurveyInput['kind'], string> = { 'level-notes': 'rows', 'ground-line': 'points' }

/** What a formula refused, beside the field of the form that it came from. Anything else is passed on. */
export function surveyProblem(error: unknown, kind: SurveyInput['kind']): unknown {
  if (!(error instanceof EngineeringInputError)) return error
  const field = error.field.replace(/^groundLine/, bodyField[kind])
  const pointer = `/${field.replace(/\[(\d+)\]/g, '.$1').replaceAll('.', '/')}`
  return new Problem('invalid-fields', {
    detail: error.message,
    fields: [{ pointer, message: error.message }],
  })
}
