import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { NoteView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Instant } from '../../components/layout/instant'
import { NoteActs } from './note-acts'

interface NoteItemProps {
  jobId: string
  note: NoteView
}

const marks = {
  open: { kind: 'caution', words: 'open' },
  answered: { kind: 'waiting', words: 'answered' },
  settled: { kind: 'pass', words: 'settled' },
} as const

/** Page and revision a note speaks of. */
const placeText = ({ page, revision }: NoteView): string =>
  [page === undefined ? null : `page ${page}`, revision === null ? null : `revision ${revision}`]
    .filter((part) => part !== null)
    .join(', ')

/** One note with its answers. */
export function NoteItem({ jobId, note }: NoteItemProps) {
  const place = placeText(note)
  return (
    <Box component="li" sx={{ py: 3, borderBottom: 1, borderColor: 'divider' }}>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', columnGap: 4 }}>
        <VerdictMark {...marks[note.status]} />
        <strong>{note.author}</strong>
        <Box component="span" sx={{ color: 'text.secondary' }}>
          <Instant at={note.at} />
          {place && `, ${place}`}
        </Box>
      </Box>
      <Typography sx={{ whiteSpace: 'pre-line', maxWidth: 720, pt: 1 }}>{note.text}</Typography>
      {note.answers.map((answer) => (
        <Box
          key={`${answer.at} ${answer.author}`}
          sx={{ borderLeft: 2, borderColor: 'divider', pl: 4, mt: 2 }}
        >
          <Typography variant="body2" sx={{ color: 'text.secondary' }}>
            {answer.author} answered, <Instant at={answer.at} />
          </Typography>
          <Typography sx={{ whiteSpace: 'pre-line', maxWidth: 720 }}>{answer.text}</Typography>
        </Box>
      ))}
      {note.status !== 'settled' && <NoteActs jobId={jobId} note={note} />}
    </Box>
  )
}
