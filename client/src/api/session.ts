import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query'
import type { SessionListItem, SessionView } from 'shared'
import { ProblemError } from './problem-error'
import { request } from './request'
import { sessionExpired } from './session-expired'

export const sessionKey = ['session'] as const

/** Null when nobody is signed in; that is an answer, not an error. */
async function fetchSession(signal: AbortSignal): Promise<SessionView | null> {
  try {
    return await request<SessionView>('/session', { signal })
  } catch (error) {
    if (error instanceof ProblemError && error.slug === 'not-signed-in') {
      sessionExpired.clear()
      return null
    }
    throw error
  }
}

export const sessionQuery = queryOptions({
  queryKey: sessionKey,
  queryFn: ({ signal }) => fetchSession(signal),
  staleTime: 5 * 60_000,
})

export interface SignInBody {
  email: string
  password: string
}

/** After a change of person every cached answer belongs to somebody else. */
function useNewSession() {
  const queries = useQueryClient()
  return (session: SessionView) => {
    const earlier = queries.getQueryData<SessionView | null>(sessionKey)
    if (earlier && earlier.personId !== session.personId) queries.clear()
    queries.setQueryData(sessionKey, session)
    sessionExpired.clear()
  }
}

export function useSignIn() {
  const onSuccess = useNewSession()
  return useMutation({
    mutationFn: (body: SignInBody) => request<SessionView>('/session', { method: 'POST', body }),
    onSuccess,
  })
}

export function useOpenLink() {
  return useMutation({
    mutationFn: (body: { token: string }) =>
      request<{ emailHint: string }>('/entry/open', { method: 'POST', body }),
  })
}

export function useEnterCode() {
  const onSuccess = useNewSession()
  return useMutation({
    mutationFn: (body: { token: string; code: string }) =>
      request<SessionView>('/entry/code', { method: 'POST', body }),
    onSuccess,
  })
}

export function useSignOut() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: () => request<void>('/session', { method: 'DELETE' }),
    onSuccess: () => {
      queries.clear()
      queries.setQueryData(sessionKey, null)
    },
  })
}

export function useChooseDistrict() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (districtId: string) =>
      request<SessionView>('/session/district', { method: 'PUT', body: { districtId } }),
    onSuccess: (session) => {
      queries.clear()
      queries.setQueryData(sessionKey, session)
    },
  })
}

export const sessionsQuery = queryOptions({
  queryKey: ['sessions'],
  queryFn: ({ signal }) => request<SessionListItem[]>('/sessions', { signal }),
})

export function useEndSession() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (id: string) => request<void>(`/sessions/${id}`, { method: 'DELETE' }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['sessions'] }),
  })
}

export function useChangePassword() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (body: { currentPassword: string; newPassword: string }) =>
      request<void>('/account/password', { method: 'POST', body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['sessions'] }),
  })
}
