import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { Navigate, useParams } from 'react-router-dom'
import type { DesignView, JobView } from 'shared'
import { designsQuery } from '../api/designs'
import { jobQuery } from '../api/jobs'
import { surveyQuery } from '../api/surveys'
import { EmptyState } from '../components/feedback/empty-state'
import { QueryGate } from '../components/feedback/query-gate'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'
import { TextLink } from '../components/layout/text-link'
import { DesignForm } from '../features/designs/design-form'
import { partSpec } from '../features/designs/part-catalogue'
import { useJobFrameLock } from '../features/jobs/job-frame-lock'

/** One part of one design. */
export function DesignPage() {
  const { jobId = '', designId = '' } = useParams()
  const job = useQuery(jobQuery(jobId))
  const designs = useQuery(designsQuery(jobId))
  return (
    <QueryGate query={job}>
      {(found) => (
        <QueryGate query={designs} lines={12}>
          {(all) => {
            const design = all.find(({ id }) => id === designId)
            return design ? <PartOfDesign key={designId} job={found} design={design} /> : <NoDesign />
          }}
        </QueryGate>
      )}
    </QueryGate>
  )
}

function PartOfDesign({ job, design }: { job: JobView; design: DesignView }) {
  const { part = '' } = useParams()
  const lock = useJobFrameLock(job, 'design:write')
  const survey = useQuery(surveyQuery(job.id, job.hasSurvey))
  const spec = partSpec(part)
  if (spec === undefined) return <Navigate to={`/jobs/${job.id}/design`} replace />
  return (
    <Page
      title={design.name}
      beside={design.isChosen ? 'chosen' : 'an alternative'}
      action={<TextLink to={`/jobs/${job.id}/design`}>All designs</TextLink>}
    >
      {lock !== null && <Typography sx={{ my: 2 }}>{lock}</Typography>}
      <DesignForm
        design={design}
        spec={spec}
        lock={lock}
        facts={{ body: job.body, waterSurfaceFt: survey.data?.survey.waterSurfaceFt }}
      />
    </Page>
  )
}

function NoDesign() {
  const { jobId = '' } = useParams()
  return (
    <Page title="No such design">
      <EmptyState
        title="This job has no such design"
        action={<LinkButton to={`/jobs/${jobId}/design`} words="All designs" isMain />}
      >
        The address may be mistyped.
      </EmptyState>
    </Page>
  )
}
