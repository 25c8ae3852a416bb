import Box from '@mui/material/Box'
import { useQuery } from '@tanstack/react-query'
import { Outlet, useParams } from 'react-router-dom'
import { jobQuery } from '../api/jobs'
import { QueryGate } from '../components/feedback/query-gate'
import { JobFrameHeader } from '../features/jobs/job-frame-header'
import { JobFrameTabs } from '../features/jobs/job-frame-tabs'

/** Around every page of one job: which it is, where it stands, and its pages as links. */
export function JobFramePage() {
  const { jobId = '' } = useParams()
  const query = useQuery(jobQuery(jobId))
  return (
    <QueryGate query={query}>
      {(job) => (
        <>
          <Box sx={{ px: { xs: 4, md: 6 } }}>
            <JobFrameHeader job={job} />
            <JobFrameTabs job={job} />
          </Box>
          <Outlet />
        </>
      )}
    </QueryGate>
  )
}
