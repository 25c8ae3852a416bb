import {
  groundLineFromNotes,
  reduceLevelNotes,
  resolveGroundLine,
  type SurveyInput,
  type SurveyView,
} from 'shared'

export type ReducedSurvey = Pick<SurveyView, 'groundLine' | 'reduction'>

/** The ground line of a survey, whichever way it was measured. Throws the sentence of the first impossible figure. */
export function reduceSurvey(survey: SurveyInput): ReducedSurvey {
  if (survey.kind === 'ground-line') {
    const { points, waterSurfaceFt } = survey
    return { groundLine: resolveGroundLine({ groundLine: points, waterSurfaceFt }), reduction: null }
  }
  const reduction = reduceLevelNotes(survey)
  return { groundLine: groundLineFromNotes({ points: reduction.points }), reduction }
}
