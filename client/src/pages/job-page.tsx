import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { jobQuery } from '../api/jobs'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { JobOverviewNext } from '../features/jobs/job-overview-next'
import { JobOverviewPlace } from '../features/jobs/job-overview-place'
import { JobOverviewRevisions } from '../features/jobs/job-overview-revisions'
import { JobOverviewWay } from '../features/jobs/job-overview-way'
import { JobOverviewWithdraw } from '../features/jobs/job-overview-withdraw'

/** One job at a glance. */
export function JobPage() {
  const { jobId = '' } = useParams()
  const query = useQuery(jobQuery(jobId))
  return (
    <Page title="Overview" maxWidth={960}>
      <QueryGate query={query}>
        {(job) => (
          <>
            <Section title="Next">
              <JobOverviewNext job={job} />
            </Section>
            <Section title="What is done">
              <JobOverviewWay job={job} />
            </Section>
            <Section title="Who and where">
              <JobOverviewPlace job={job} />
            </Section>
            <Section title="Revisions">
              <JobOverviewRevisions revisions={job.revisions} />
            </Section>
            {job.actions.some(({ action, enabled }) => action === 'withdraw' && enabled) && (
              <Section title="If it will not be built">
                <JobOverviewWithdraw job={job} />
              </Section>
            )}
          </>
        )}
      </QueryGate>
    </Page>
  )
}
