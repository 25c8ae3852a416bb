import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { eventsQuery } from '../api/jobs'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Timeline } from '../features/timeline/timeline'

export function TimelinePage() {
  const { jobId = '' } = useParams()
  const query = useQuery(eventsQuery(jobId))
  return (
    <Page title="Timeline" maxWidth={960}>
      <QueryGate query={query} lines={10}>
        {(events) => <Timeline events={events} />}
      </QueryGate>
    </Page>
  )
}
