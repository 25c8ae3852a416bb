import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { endStates, type JobAction, type JobView } from 'shared'
import { useMay } from '../../api/session-context'
import { LinkButton } from '../../components/layout/link-button'

/** The page on which an act is done; an act that is not listed has no page yet. */
const pageOfAct: Partial<Record<JobAction, string>> = {
  'send-to-landowner': 'packet',
  approve: 'review',
  return: 'review',
  send: 'send',
}

/** What a job needs before any act of its state can be done. */
function firstStep({ hasSurvey, chosenDesignId }: JobView): { path: string; words: string } | null {
  if (!hasSurvey) return { path: 'survey', words: 'Enter the level notes' }
  return chosenDesignId === null ? { path: 'design', words: 'Begin a design' } : null
}

interface JobOverviewNextProps {
  job: JobView
}

/** What this person can do next, or for whom the job waits. */
export function JobOverviewNext({ job }: JobOverviewNextProps) {
  const may = useMay()
  const step = job.state === 'draft' && may('design:write') ? firstStep(job) : null
  const acts = job.actions.filter(({ action }) => pageOfAct[action] !== undefined)
  return (
    <Box sx={{ my: 4 }}>
      {endStates.includes(job.state) ? (
        <Typography>This job has ended.</Typography>
      ) : (
        <Typography>It waits for {job.waitsFor}.</Typography>
      )}
      {step && (
        <Box sx={{ mt: 3 }}>
          <LinkButton to={`/jobs/${job.id}/${step.path}`} words={step.words} isMain />
        </Box>
      )}
      {acts.map(({ action, words, enabled, reasons }, index) => (
        <Box key={action} sx={{ display: 'flex', flexWrap: 'wrap', gap: 4, alignItems: 'center', mt: 3 }}>
          <LinkButton
            to={`/jobs/${job.id}/${pageOfAct[action]}`}
            words={words}
            isMain={enabled && index === 0}
          />
          {reasons.length > 0 && (
            <Box component="ul" sx={{ m: 0, pl: 5 }}>
              {reasons.map((reason) => (
                <li key={reason}>{reason}</li>
              ))}
            </Box>
          )}
        </Box>
      ))}
    </Box>
  )
}
