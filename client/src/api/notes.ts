import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { NoteInput, NoteView } from 'shared'
import { useJobRefresh } from './jobs'
import { request } from './request'

const notesKey = (jobId: string) => ['jobs', jobId, 'notes'] as const

export const notesQuery = (jobId: string) =>
  queryOptions({
    queryKey: notesKey(jobId),
    queryFn: ({ signal }) => request<NoteView[]>(`/jobs/${jobId}/notes`, { signal }),
  })

function useNotesChanged(jobId: string) {
  const queries = useQueryClient()
  const refresh = useJobRefresh()
  return async () => {
    await queries.invalidateQueries({ queryKey: notesKey(jobId) })
    await refresh(jobId)
  }
}

export function useWriteNote(jobId: string) {
  const onSuccess = useNotesChanged(jobId)
  return useMutation({
    mutationFn: (body: NoteInput) => request<NoteView>(`/jobs/${jobId}/notes`, { method: 'POST', body }),
    onSuccess,
  })
}

export function useAnswerNote(jobId: string, noteId: string) {
  const onSuccess = useNotesChanged(jobId)
  return useMutation({
    mutationFn: (body: { text: string }) =>
      request<NoteView>(`/notes/${noteId}/answer`, { method: 'POST', body }),
    onSuccess,
  })
}

export function useSettleNote(jobId: string, noteId: string) {
  const onSuccess = useNotesChanged(jobId)
  return useMutation({
    mutationFn: () => request<NoteView>(`/notes/${noteId}/settle`, { method: 'POST', body: {} }),
    onSuccess,
  })
}
