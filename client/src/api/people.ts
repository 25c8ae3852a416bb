import { keepPreviousData, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { PersonInput, PersonView, ProducerInput, ProducerView } from 'shared'
import { request, requestVersioned } from './request'

export const peopleQuery = queryOptions({
  queryKey: ['people'],
  queryFn: ({ signal }) => request<PersonView[]>('/people', { signal }),
})

export function useAddPerson() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: PersonInput) =>
      request<{ person: PersonView; temporaryPassword: string }>('/people', { method: 'POST', body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['people'] }),
  })
}

export const producersQuery = (find: string) =>
  queryOptions({
    queryKey: ['producers', find],
    queryFn: ({ signal }) =>
      request<ProducerView[]>(`/producers?${new URLSearchParams({ find }).toString()}`, { signal }),
    placeholderData: keepPreviousData,
  })

export function useAddProducer() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: ProducerInput) => request<ProducerView>('/producers', { method: 'POST', body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['producers'] }),
  })
}

export const producerQuery = (id: string) =>
  queryOptions({
    queryKey: ['producer', id],
    queryFn: ({ signal }) => requestVersioned<ProducerView>(`/producers/${id}`, { signal }),
  })

export function useSaveProducer(id: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: ({ body, version }: { body: ProducerInput; version: number }) =>
      requestVersioned<ProducerView>(`/producers/${id}`, { method: 'PUT', body, version }),
    onSuccess: async (saved) => {
      queries.setQueryData(producerQuery(id).queryKey, saved)
      await queries.invalidateQueries({ queryKey: ['producers'] })
      // A job shows the names and addresses of its producers.
      await queries.invalidateQueries({ queryKey: ['jobs'] })
    },
  })
}
