import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { stateWords, type JobView } from 'shared'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { Section } from '../../components/layout/section'

interface SendToLandownerProps {
  job: Pick<JobView, 'id' | 'state' | 'actions' | 'waitsFor' | 'producers'>
}

/** Hands the packet to the landowner, or says what still blocks that. */
export function SendToLandowner({ job }: SendToLandownerProps) {
  const act = useAct(job.id)
  const offered = job.actions.find(({ action }) => action === 'send-to-landowner')
  return (
    <Section title="To the landowner" aside={job.producers.map(({ name }) => name).join(', ')}>
      <Box sx={{ py: 3 }}>
        <ProblemAlert error={act.error} />
        {offered ? (
          <>
            <ActButton
              words={offered.words}
              reasons={offered.reasons}
              isBlocked={!offered.enabled}
              isBusy={act.isPending}
              busyWords="Sending…"
              isMain
              onAct={() => act.mutate({ action: 'send-to-landowner' })}
            />
            {offered.enabled && (
              <Typography variant="body2" sx={{ color: 'text.secondary', mt: 2 }}>
                Each signer gets a mail with a link of their own. The design cannot be changed until the job
                is returned.
              </Typography>
            )}
          </>
        ) : (
          <Typography role="status">
            The job is {stateWords[job.state]}. It waits for: {job.waitsFor}.
          </Typography>
        )}
      </Box>
    </Section>
  )
}
