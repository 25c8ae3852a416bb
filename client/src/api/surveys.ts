import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { LevelNoteRow, SurveyInput, SurveyView } from 'shared'
import { useJobRefresh } from './jobs'
import { ProblemError } from './problem-error'
import { request } from './request'

export interface CsvRowError {
  row: number
  column: string | null
  message: string
}

const surveyKey = (jobId: string) => ['jobs', jobId, 'survey'] as const

/** Null when the job has no survey yet; where the job says so, nothing is asked. */
export const surveyQuery = (jobId: string, hasSurvey = true) =>
  queryOptions({
    queryKey: surveyKey(jobId),
    queryFn: async ({ signal }): Promise<SurveyView | null> => {
      if (!hasSurvey) return null
      try {
        return await request<SurveyView>(`/jobs/${jobId}/survey`, { signal })
      } catch (error) {
        if (error instanceof ProblemError && error.slug === 'not-found') return null
        throw error
      }
    },
    refetchOnWindowFocus: false,
  })

export function useSaveSurvey(jobId: string) {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return useMutation({
    mutationFn: ({ survey, version }: { survey: SurveyInput; version: number }) =>
      request<SurveyView>(`/jobs/${jobId}/survey`, { method: 'PUT', body: survey, version }),
    onSuccess: async (view) => {
      queries.setQueryData(surveyKey(jobId), view)
      await refresh(jobId)
    },
  })
}

export function useReadNotesCsv() {
  return useMutation({
    mutationFn: (file: File) =>
      request<{ rows: LevelNoteRow[]; errors: CsvRowError[] }>('/surveys/read-csv', { method: 'POST', file }),
  })
}
