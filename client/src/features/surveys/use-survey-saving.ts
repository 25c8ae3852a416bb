import { useQueryClient } from '@tanstack/react-query'
import { useState } from 'react'
import type { SurveyInput, SurveyView } from 'shared'
import { ProblemError } from '../../api/problem-error'
import { surveyQuery, useSaveSurvey } from '../../api/surveys'

const isStale = (error: Error | null): error is ProblemError =>
  error instanceof ProblemError && error.slug === 'stale-version'

/** The version the page began with, and what somebody else saved on top of it when that came to light. */
export function useSurveySaving(jobId: string, loaded: SurveyView | null) {
  const [base, setBase] = useState(loaded)
  const queries = useQueryClient()
  const save = useSaveSurvey(jobId)
  const stale = isStale(save.error) ? save.error : null
  const theirs = (stale?.current ?? null) as SurveyView | null

  return {
    base,
    isPending: save.isPending,
    problem: stale === null ? save.error : null,
    stale: stale === null ? null : { sentence: stale.message, theirs },
    saveOver: async (survey: SurveyInput, version: number) =>
      setBase(await save.mutateAsync({ survey, version })),
    takeTheirs: () => {
      setBase(theirs)
      queries.setQueryData(surveyQuery(jobId).queryKey, theirs)
      save.reset()
    },
  }
}
