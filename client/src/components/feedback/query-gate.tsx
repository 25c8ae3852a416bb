import Button from '@mui/material/Button'
import type { ReactNode } from 'react'
import { LoadingLines } from './loading-lines'
import { ProblemAlert } from './problem-alert'

interface QueryLike<T> {
  data: T | undefined
  error: Error | null
  refetch: () => unknown
}

interface QueryGateProps<T> {
  query: QueryLike<T>
  lines?: number
  children: (data: T) => ReactNode
}

/** Shows what came, lines while it comes, or why it did not with a way to try again. */
export function QueryGate<T>({ query, lines, children }: QueryGateProps<T>) {
  if (query.data !== undefined) return <>{children(query.data)}</>
  if (query.error === null) return <LoadingLines count={lines} />
  return (
    <ProblemAlert error={query.error}>
      <Button variant="text" onClick={() => void query.refetch()}>
        Try again
      </Button>
    </ProblemAlert>
  )
}
