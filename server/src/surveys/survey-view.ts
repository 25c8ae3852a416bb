import type { SurveyView } from 'shared'
import type { Survey } from './survey.entity.js'
import { surveyRemarks } from './survey-remarks.js'

export const surveyView = ({ version, survey, groundLine, reduction }: Survey): SurveyView => ({
  version,
  survey,
  groundLine,
  reduction,
  remarks: surveyRemarks(reduction),
})
