import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useNavigate, useParams } from 'react-router-dom'
import type { JobView } from 'shared'
import { designsQuery } from '../api/designs'
import { jobQuery } from '../api/jobs'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { DesignTable } from '../features/designs/design-table'
import { NewDesignForm } from '../features/designs/new-design-form'
import { useJobFrameLock } from '../features/jobs/job-frame-lock'

/** The designs of a job beside each other. */
export function DesignsPage() {
  const { jobId = '' } = useParams()
  const job = useQuery(jobQuery(jobId))
  return (
    <Page title="Design" beside="The packet is made of the one that is chosen.">
      <QueryGate query={job}>{(found) => <DesignsOfJob job={found} />}</QueryGate>
    </Page>
  )
}

function DesignsOfJob({ job }: { job: JobView }) {
  const navigate = useNavigate()
  const lock = useJobFrameLock(job, 'design:write')
  const query = useQuery(designsQuery(job.id))
  return (
    <>
      {lock !== null && <Typography sx={{ my: 2 }}>{lock}</Typography>}
      <QueryGate query={query}>
        {(designs) => (
          <>
            {designs.length > 0 ? (
              <DesignTable jobId={job.id} designs={designs} isLocked={lock !== null} />
            ) : (
              <EmptyState title="No design yet">
                A design holds what you choose: herd, levels, ramp, rock, fence and the rest. Give the first
                one a name.
              </EmptyState>
            )}
            {lock === null && (
              <Section title={designs.length > 0 ? 'Another design' : 'First design'}>
                <NewDesignForm
                  jobId={job.id}
                  designs={designs}
                  onMade={({ id }) => void navigate(`/jobs/${job.id}/design/${id}/herd`)}
                />
              </Section>
            )}
          </>
        )}
      </QueryGate>
    </>
  )
}
