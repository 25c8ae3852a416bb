import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { Act, DeskItem, EventView, JobInput, JobList, JobState, JobView, MailView } from 'shared'
import { request } from './request'
import { useIntention } from './use-intention'

export const jobKeys = {
  all: ['jobs'] as const,
  list: (filter: JobFilter) => ['jobs', 'list', filter] as const,
  one: (id: string) => ['jobs', id] as const,
  events: (id: string) => ['jobs', id, 'events'] as const,
  mail: (id: string) => ['jobs', id, 'mail'] as const,
}

export interface JobFilter {
  state?: JobState
  find?: string
}

export const jobQuery = (id: string) =>
  queryOptions({
    queryKey: jobKeys.one(id),
    queryFn: ({ signal }) => request<JobView>(`/jobs/${id}`, { signal }),
  })

export const jobListQuery = (filter: JobFilter) =>
  infiniteQueryOptions({
    queryKey: jobKeys.list(filter),
    queryFn: ({ pageParam, signal }) => {
      const query = new URLSearchParams({ limit: '25' })
      if (filter.state) query.set('state', filter.state)
      if (filter.find) query.set('find', filter.find)
      if (pageParam !== null) query.set('cursor', pageParam)
      return request<JobList>(`/jobs?${query.toString()}`, { signal })
    },
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
  })

export const deskQuery = queryOptions({
  queryKey: ['desk'],
  queryFn: ({ signal }) => request<DeskItem[]>('/desk', { signal }),
})

export const eventsQuery = (id: string) =>
  queryOptions({
    queryKey: jobKeys.events(id),
    queryFn: ({ signal }) => request<EventView[]>(`/jobs/${id}/events`, { signal }),
  })

export const mailQuery = (id: string) =>
  queryOptions({
    queryKey: jobKeys.mail(id),
    queryFn: ({ signal }) => request<MailView[]>(`/jobs/${id}/mail`, { signal }),
    refetchInterval: (query) => (query.state.data?.some((mail) => mail.status === 'waiting') ? 2000 : false),
  })

function useMailAgain<Asked>(jobId: string, path: (asked: Asked) => string) {
  const intention = useIntention()
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (asked: Asked) =>
      intention.run({ path: path(asked) }, (idempotencyKey) =>
        request<MailView[]>(`/jobs/${jobId}${path(asked)}`, { method: 'POST', body: {}, idempotencyKey }),
      ),
    onSuccess: (mail) => queries.setQueryData(jobKeys.mail(jobId), mail),
  })
}

/** A failed message once more. */
export const useSendMailAgain = (jobId: string) =>
  useMailAgain<string>(jobId, (mailId) => `/mail/${mailId}/send-again`)

/** A new link to each signer; the earlier ones end. */
export const useSendLinksAgain = (jobId: string) => useMailAgain<void>(jobId, () => '/links')

/** A change of one job touches its page, its lists and what waits on desks. */
export function useJobRefresh() {
  const queries = useQueryClient()
  return async (jobId: string) => {
    await Promise.all([
      queries.invalidateQueries({ queryKey: jobKeys.one(jobId) }),
      queries.invalidateQueries({ queryKey: ['jobs', 'list'] }),
      queries.invalidateQueries({ queryKey: ['desk'] }),
    ])
  }
}

export function useMakeJob() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: JobInput) => request<JobView>('/jobs', { method: 'POST', body }),
    onSuccess: async (job) => {
      queries.setQueryData(jobKeys.one(job.id), job)
      await queries.invalidateQueries({ queryKey: ['jobs', 'list'] })
      await queries.invalidateQueries({ queryKey: ['desk'] })
    },
  })
}

/** One act on one job, at most once however often it is pressed. */
export function useAct(jobId: string) {
  const intention = useIntention()
  const refresh = useJobRefresh()
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (act: Act) =>
      intention.run(act, (idempotencyKey) =>
        request<JobView>(`/jobs/${jobId}/acts`, { method: 'POST', body: act, idempotencyKey }),
      ),
    onSuccess: async (job) => {
      queries.setQueryData(jobKeys.one(jobId), job)
      await refresh(jobId)
    },
    onError: () => queries.invalidateQueries({ queryKey: jobKeys.one(jobId), exact: true }),
  })
}
