import { useSearchParams } from 'react-router-dom'
import { useMay } from '../api/session-context'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { useDebounced } from '../components/layout/use-debounced'
import { asState, JobFilterBar } from '../features/jobs/job-filter'
import { JobListView } from '../features/jobs/job-list'

/** The filter lives in the address, so that Back, reload and a sent link show the same table. */
export function JobsPage() {
  const may = useMay()
  const [query, setQuery] = useSearchParams()
  const state = asState(query.get('state'))
  const find = query.get('find') ?? undefined
  const settledFind = useDebounced(find, 300)
  return (
    <Page title="Jobs" action={may('job:create') && <LinkButton to="/jobs/new" words="New job" isMain />}>
      <JobFilterBar
        filter={{ state, find }}
        onChange={(next) =>
          setQuery(
            { ...(next.state ? { state: next.state } : {}), ...(next.find ? { find: next.find } : {}) },
            { replace: true },
          )
        }
      />
      <JobListView filter={{ state, find: settledFind }} />
    </Page>
  )
}
