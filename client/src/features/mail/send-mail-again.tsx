import Box from '@mui/material/Box'
import type { MailView } from 'shared'
import { useSendMailAgain } from '../../api/jobs'
import { useMay } from '../../api/session-context'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'

interface SendMailAgainProps {
  jobId: string
  message: MailView
}

/** For a message that failed. One that carried a way in has lost its text; a new link takes its place. */
export function SendMailAgain({ jobId, message }: SendMailAgainProps) {
  const again = useSendMailAgain(jobId)
  const may = useMay()
  if (message.status !== 'failed' || message.isSecret || !may('mail:send-again')) return null
  return (
    <Box sx={{ py: 2 }}>
      <ProblemAlert error={again.error} />
      <ActButton
        words="Send it again"
        busyWords="Sending…"
        isBusy={again.isPending}
        onAct={() => again.mutate(message.id)}
      />
    </Box>
  )
}
