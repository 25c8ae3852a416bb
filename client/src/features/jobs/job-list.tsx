import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useInfiniteQuery } from '@tanstack/react-query'
import { jobListQuery, type JobFilter } from '../../api/jobs'
import { useMay } from '../../api/session-context'
import { EmptyState } from '../../components/feedback/empty-state'
import { QueryGate } from '../../components/feedback/query-gate'
import { LinkButton } from '../../components/layout/link-button'
import { JobTable } from './job-table'

interface JobListViewProps {
  filter: JobFilter
}

export function JobListView({ filter }: JobListViewProps) {
  const query = useInfiniteQuery(jobListQuery(filter))
  return (
    <QueryGate query={query} lines={10}>
      {({ pages }) => {
        const jobs = pages.flatMap((page) => page.jobs)
        if (jobs.length === 0) return <NoJobs isFiltered={Boolean(filter.find ?? filter.state)} />
        return (
          <>
            <JobTable jobs={jobs} />
            <Box sx={{ display: 'flex', gap: 4, alignItems: 'center', mt: 4 }}>
              <span role="status">
                {jobs.length === 1 ? '1 job shown' : `${jobs.length} jobs shown`}
                {query.hasNextPage ? '' : ', that is all'}
              </span>
              {query.hasNextPage && (
                <Button aria-disabled={query.isFetchingNextPage} onClick={() => void query.fetchNextPage()}>
                  {query.isFetchingNextPage ? 'Fetching…' : 'Show more'}
                </Button>
              )}
            </Box>
          </>
        )
      }}
    </QueryGate>
  )
}

function NoJobs({ isFiltered }: { isFiltered: boolean }) {
  const may = useMay()
  if (isFiltered) {
    return <EmptyState title="No job fits">Look for fewer letters, or choose “all” states.</EmptyState>
  }
  return (
    <EmptyState
      title="No jobs yet"
      action={may('job:create') && <LinkButton to="/jobs/new" words="Make the first job" isMain />}
    >
      A job holds everything of one watering ramp: survey, design, packet, signatures.
    </EmptyState>
  )
}
