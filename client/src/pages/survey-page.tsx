import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import type { JobView } from 'shared'
import { jobQuery } from '../api/jobs'
import { surveyQuery } from '../api/surveys'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { useJobFrameLock } from '../features/jobs/job-frame-lock'
import { SurveyForm } from '../features/surveys/survey-form'

/** The measured ground of a job. */
export function SurveyPage() {
  const { jobId = '' } = useParams()
  const job = useQuery(jobQuery(jobId))
  return (
    <Page title="Survey" beside={job.data && `${job.data.waterName}, down the middle of the access`}>
      <QueryGate query={job}>{(found) => <SurveyOfJob job={found} />}</QueryGate>
    </Page>
  )
}

function SurveyOfJob({ job }: { job: JobView }) {
  const lock = useJobFrameLock(job, 'survey:write')
  const query = useQuery(surveyQuery(job.id, job.hasSurvey))
  return (
    <>
      {lock !== null && <Typography sx={{ my: 2 }}>{lock}</Typography>}
      <QueryGate query={query} lines={12}>
        {(survey) => <SurveyForm jobId={job.id} loaded={survey} lock={lock} />}
      </QueryGate>
    </>
  )
}
