import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { MailView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Instant } from '../../components/layout/instant'
import { mailSentence } from './mail-words'
import { SendMailAgain } from './send-mail-again'

interface MailListProps {
  jobId: string
  mail: readonly MailView[]
}

const marks = {
  waiting: { kind: 'waiting', words: 'waiting' },
  sent: { kind: 'pass', words: 'sent' },
  failed: { kind: 'fail', words: 'failed' },
} as const

/** Every message of the job, newest first. */
export function MailList({ jobId, mail }: MailListProps) {
  if (mail.length === 0) {
    return <Typography sx={{ py: 2, color: 'text.secondary' }}>No message of this job yet.</Typography>
  }
  const newestFirst = [...mail].sort((a, b) => b.queuedAt.localeCompare(a.queuedAt))
  return (
    <Box component="ul" aria-live="polite" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {newestFirst.map((message) => (
        <MailLine key={message.id} jobId={jobId} message={message} />
      ))}
    </Box>
  )
}

function MailLine({ jobId, message }: { jobId: string; message: MailView }) {
  const { status, to, subject, queuedAt, sentAt, attachment, messageId } = message
  const sentence = mailSentence(message)
  const muted = { color: 'text.secondary', overflowWrap: 'anywhere' }
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', sm: '96px minmax(0, 1fr)' },
        alignItems: 'start',
        columnGap: 4,
        rowGap: 1,
        py: 3,
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <VerdictMark {...marks[status]} />
      <Box sx={{ minWidth: 0 }}>
        <Typography>
          <strong>{subject}</strong>, to {to}
        </Typography>
        {sentence && (
          <Typography sx={{ color: 'error.main', overflowWrap: 'anywhere' }}>{sentence}</Typography>
        )}
        <SendMailAgain jobId={jobId} message={message} />
        <Typography variant="body2" sx={muted}>
          Put in the post <Instant at={queuedAt} />
          {sentAt !== null && (
            <>
              , went out <Instant at={sentAt} />
            </>
          )}
          {attachment && `, with ${attachment.filename}`}. Message-ID {messageId}
        </Typography>
      </Box>
    </Box>
  )
}
