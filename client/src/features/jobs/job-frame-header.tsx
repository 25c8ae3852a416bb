import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { endStates, stateWords, type JobView } from 'shared'
import { TextLink } from '../../components/layout/text-link'
import { WayMark } from './way-mark'

interface JobFrameHeaderProps {
  job: JobView
}

/** Which job this is and where it stands. The page below has the heading of its own. */
export function JobFrameHeader({ job }: JobFrameHeaderProps) {
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'baseline',
        columnGap: 4,
        rowGap: 1,
        pt: 3,
        pb: 1,
      }}
    >
      <Typography variant="h2" component="p">
        <TextLink to={`/jobs/${job.id}`} isStrong>
          {job.title}
        </TextLink>
      </Typography>
      <Typography sx={{ color: 'text.secondary' }}>
        {job.number}, {job.producers.map(({ name }) => name).join(', ')}
      </Typography>
      <Box
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          alignItems: 'center',
          columnGap: 3,
          rowGap: 1,
          ml: { md: 'auto' },
        }}
      >
        <WayMark state={job.state} />
        <Typography>
          <strong>{stateWords[job.state]}</strong>
          {!endStates.includes(job.state) && `, waits for ${job.waitsFor}`}
        </Typography>
      </Box>
    </Box>
  )
}
