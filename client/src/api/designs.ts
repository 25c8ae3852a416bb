import { keepPreviousData, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { DesignPlan, DesignResult, DesignView, JobView, ResolvedWith } from 'shared'
import { jobKeys, useJobRefresh } from './jobs'
import { request } from './request'

export interface Calculated {
  result: DesignResult
  resolvedWith: ResolvedWith
}

export interface DesignBody {
  name: string
  plan: DesignPlan
}

const designsKey = (jobId: string) => ['jobs', jobId, 'designs'] as const

export const designsQuery = (jobId: string) =>
  queryOptions({
    queryKey: designsKey(jobId),
    queryFn: ({ signal }) => request<DesignView[]>(`/jobs/${jobId}/designs`, { signal }),
  })

/** Works a plan out on the server with the rules and prices in force; nothing is stored. */
export const calculateQuery = (jobId: string, plan: DesignPlan) =>
  queryOptions({
    queryKey: ['calculate', jobId, plan],
    queryFn: ({ signal }) =>
      request<Calculated>(`/jobs/${jobId}/calculate`, { method: 'POST', body: plan, signal }),
    placeholderData: keepPreviousData,
    staleTime: 60_000,
    retry: false,
  })

function useStoreDesign(jobId: string) {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return async (design: DesignView) => {
    queries.setQueryData<DesignView[]>(designsKey(jobId), (earlier) =>
      earlier?.some((one) => one.id === design.id)
        ? earlier.map((one) => (one.id === design.id ? design : one))
        : [...(earlier ?? []), design],
    )
    await refresh(jobId)
  }
}

export function useMakeDesign(jobId: string) {
  const onSuccess = useStoreDesign(jobId)
  return useMutation({
    mutationFn: (body: DesignBody) => request<DesignView>(`/jobs/${jobId}/designs`, { method: 'POST', body }),
    onSuccess,
  })
}

export function useSaveDesign(jobId: string, designId: string) {
  const onSuccess = useStoreDesign(jobId)
  return useMutation({
    mutationFn: ({ body, version }: { body: DesignBody; version: number }) =>
      request<DesignView>(`/designs/${designId}`, { method: 'PUT', body, version }),
    onSuccess,
  })
}

export function useChooseDesign(jobId: string) {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return useMutation({
    mutationFn: (designId: string) =>
      request<JobView>(`/designs/${designId}/choose`, { method: 'POST', body: {} }),
    onSuccess: async (job) => {
      queries.setQueryData(jobKeys.one(jobId), job)
      await refresh(jobId)
    },
  })
}
