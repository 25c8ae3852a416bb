import { useQuery } from '@tanstack/react-query'
import { deskQuery } from '../api/jobs'
import { useMay } from '../api/session-context'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { DeskList } from '../features/desk/desk-list'

export function DeskPage() {
  const may = useMay()
  const query = useQuery({ ...deskQuery, refetchInterval: 60_000 })
  return (
    <Page
      title="Waiting for you"
      beside={query.data && query.data.length > 0 ? 'oldest first' : undefined}
      action={may('job:create') && <LinkButton to="/jobs/new" words="New job" />}
    >
      <QueryGate query={query}>
        {(items) =>
          items.length > 0 ? (
            <DeskList items={items} />
          ) : (
            <EmptyState
              title="Nothing waits for you"
              action={may('job:list') && <LinkButton to="/jobs" words="See all jobs" isMain />}
            >
              When a job needs your next act, it stands here with one button.
              {may('job:create') && ' A job begins with a producer and the water the stock walks into.'}
            </EmptyState>
          )
        }
      </QueryGate>
    </Page>
  )
}
