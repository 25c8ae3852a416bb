import { QueryClient } from '@tanstack/react-query'
import { ProblemError } from '../api/problem-error'

/** A refusal will not change by asking again; a lost line or a busy server may. */
const isWorthAnotherTry = (error: Error): boolean =>
  !(error instanceof ProblemError) || error.slug === 'no-connection' || error.slug === 'not-ready'

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 10_000,
      retry: (failures, error) => failures < 2 && isWorthAnotherTry(error),
    },
    mutations: { retry: false },
  },
})
