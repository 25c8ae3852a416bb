import { surveyInputSchema, type SurveyInput } from 'shared'
import { readSchema } from '../../components/fields/read-schema'
import { readSurvey, type SurveyDraft } from './survey-draft'

interface Demand {
  path: string[]
  message: string
}

type Closing = NonNullable<Extract<SurveyInput, { kind: 'level-notes' }>['closing']>

/** What the formulas need together, asked for at the field where it is missing. */
function closingDemands(closing: Closing): Demand[] {
  const { coefficientFt, perSetupFt, minimumFt, lengthFt, lengthMiles } = closing
  if (coefficientFt === undefined && perSetupFt === undefined && minimumFt === undefined) {
    const message = 'Say how much is allowed: for one mile of line, for one setup, or at least'
    return [{ path: ['closing', 'coefficientFt'], message }]
  }
  if (coefficientFt !== undefined && lengthFt === undefined && lengthMiles === undefined) {
    return [
      { path: ['closing', 'lengthFt'], message: 'Give the length of the line for the figure of one mile' },
    ]
  }
  return []
}

function demands(survey: SurveyInput): Demand[] {
  const lines = survey.kind === 'level-notes' ? survey.rows : survey.points
  const isSounded = lines.some((line) => 'waterDepthFt' in line && line.waterDepthFt !== undefined)
  const surface =
    isSounded && survey.waterSurfaceFt === undefined
      ? [{ path: ['waterSurfaceFt'], message: 'Give the water surface, since there are depths below it' }]
      : []
  const closing =
    survey.kind === 'level-notes' && survey.closing !== undefined ? closingDemands(survey.closing) : []
  return [...surface, ...closing]
}

export const surveyFormSchema = readSchema<SurveyDraft, SurveyInput>(
  surveyInputSchema,
  readSurvey,
).superRefine((survey, context) => {
  for (const { path, message } of demands(survey)) context.addIssue({ code: 'custom', path, message })
})
