import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { ScheduleInput, ScheduleLine, ScheduleListItem, ScheduleView } from 'shared'
import { request } from './request'
import type { CsvRowError } from './surveys'
import { useIntention } from './use-intention'

const scheduleKey = (id: string) => ['schedules', id] as const

export const schedulesQuery = queryOptions({
  queryKey: ['schedules'],
  queryFn: ({ signal }) => request<ScheduleListItem[]>('/schedules', { signal }),
})

export const scheduleQuery = (id: string) =>
  queryOptions({
    queryKey: scheduleKey(id),
    queryFn: ({ signal }) => request<ScheduleView>(`/schedules/${id}`, { signal }),
  })

function useStoreSchedule() {
  const queries = useQueryClient()
  return async (schedule: ScheduleView) => {
    queries.setQueryData(scheduleKey(schedule.id), schedule)
    await queries.invalidateQueries({ queryKey: ['schedules'] })
  }
}

export function useMakeSchedule() {
  const onSuccess = useStoreSchedule()
  return useMutation({
    mutationFn: (body: ScheduleInput) => request<ScheduleView>('/schedules', { method: 'POST', body }),
    onSuccess,
  })
}

export function useMapSchedule(id: string) {
  const onSuccess = useStoreSchedule()
  return useMutation({
    mutationFn: ({
      mapping,
      version,
    }: {
      mapping: Pick<ScheduleLine, 'code' | 'quantityKey'>[]
      version: number
    }) => request<ScheduleView>(`/schedules/${id}/mapping`, { method: 'PUT', body: { mapping }, version }),
    onSuccess,
  })
}

export function usePutScheduleInForce(id: string) {
  const intention = useIntention()
  const onSuccess = useStoreSchedule()
  return useMutation({
    mutationFn: () =>
      intention.run({ id }, (idempotencyKey) =>
        request<ScheduleView>(`/schedules/${id}/put-in-force`, { method: 'POST', body: {}, idempotencyKey }),
      ),
    onSuccess,
  })
}

export function useReadScheduleCsv() {
  return useMutation({
    mutationFn: (file: File) =>
      request<{ lines: ScheduleLine[]; errors: CsvRowError[] }>('/schedules/read-csv', {
        method: 'POST',
        file,
      }),
  })
}
