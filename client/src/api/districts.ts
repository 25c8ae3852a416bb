import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { CostListInput, CostListView, CriteriaSetView, SettingsView, SettingValue } from 'shared'
import { request } from './request'
import { useIntention } from './use-intention'

export const settingsQuery = queryOptions({
  queryKey: ['settings'],
  queryFn: ({ signal }) => request<SettingsView>('/settings', { signal }),
})

export function useSaveSettings() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: ({ settings, version }: { settings: SettingValue[]; version: number }) =>
      request<SettingsView>('/settings', { method: 'PUT', body: { settings }, version }),
    onSuccess: (view) => queries.setQueryData(settingsQuery.queryKey, view),
  })
}

export const criteriaSetsQuery = queryOptions({
  queryKey: ['criteria-sets'],
  queryFn: ({ signal }) => request<CriteriaSetView[]>('/criteria-sets', { signal }),
})

export const costListsQuery = queryOptions({
  queryKey: ['cost-lists'],
  queryFn: ({ signal }) => request<CostListView[]>('/cost-lists', { signal }),
})

export function useMakeCostList() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: CostListInput) => request<CostListView>('/cost-lists', { method: 'POST', body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['cost-lists'] }),
  })
}

export function usePutCostListInForce(id: string) {
  const intention = useIntention()
  const queries = useQueryClient()
  return useMutation({
    mutationFn: () =>
      intention.run({ id }, (idempotencyKey) =>
        request<CostListView>(`/cost-lists/${id}/put-in-force`, { method: 'POST', body: {}, idempotencyKey }),
      ),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['cost-lists'] }),
  })
}
