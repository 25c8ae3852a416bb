import Typography from '@mui/material/Typography'
import type { JobView } from 'shared'
import { useSendLinksAgain } from '../../api/jobs'
import { useMay } from '../../api/session-context'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { Section } from '../../components/layout/section'

interface SendLinksAgainProps {
  job: Pick<JobView, 'id' | 'state'>
}

/** For a link that ran out, or went to an address that was wrong. */
export function SendLinksAgain({ job }: SendLinksAgainProps) {
  const again = useSendLinksAgain(job.id)
  const may = useMay()
  if (!may('mail:send-again') || job.state !== 'with-landowner') return null
  return (
    <Section title="The landowner's link">
      <Typography sx={{ py: 2 }}>
        Each signer gets a new link, to the address the producer has now. The earlier link ends.
      </Typography>
      <ProblemAlert error={again.error} />
      <ActButton
        words="Send the link again"
        busyWords="Sending…"
        isBusy={again.isPending}
        onAct={() => again.mutate()}
      />
      {again.isSuccess && (
        <Typography role="status" sx={{ pt: 2 }}>
          A new link is in the post.
        </Typography>
      )}
    </Section>
  )
}
