import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useQuery } from '@tanstack/react-query'
import { useTranslation } from 'react-i18next'
import type { NoteView } from 'shared'
import { notesQuery } from '../../api/notes'
import { Instant } from '../../components/layout/instant'
import { Section } from '../../components/layout/section'
import { LandownerGate } from './landowner-gate'

interface NoteListProps {
  jobId: string
}

/** What was asked, and what the planner answered. */
export function NoteList({ jobId }: NoteListProps) {
  const { t } = useTranslation()
  const query = useQuery(notesQuery(jobId))
  return (
    <Section title={t('job.notes')}>
      <LandownerGate query={query}>
        {(notes) =>
          notes.length === 0 ? (
            <Typography sx={{ py: 2 }}>{t('job.noNotes')}</Typography>
          ) : (
            notes.map((note) => <Note key={note.id} note={note} />)
          )
        }
      </LandownerGate>
    </Section>
  )
}

function Note({ note }: { note: NoteView }) {
  const { t } = useTranslation()
  return (
    <Box sx={{ py: 3, borderBottom: 1, borderColor: 'divider' }}>
      <Typography variant="body2" sx={{ color: 'text.secondary' }}>
        {note.author}, <Instant at={note.at} />, {t(`noteStatus.${note.status}`)}
        {note.page !== undefined && `, ${t('job.notePage', { page: note.page })}`}
      </Typography>
      <Typography sx={{ whiteSpace: 'pre-line' }}>{note.text}</Typography>
      {note.answers.map((answer) => (
        <Box key={answer.at} sx={{ borderLeft: 3, borderColor: 'primary.main', pl: 3, mt: 2 }}>
          <Typography variant="body2" sx={{ color: 'text.secondary' }}>
            {answer.author}, <Instant at={answer.at} />
          </Typography>
          <Typography sx={{ whiteSpace: 'pre-line' }}>{answer.text}</Typography>
        </Box>
      ))}
    </Box>
  )
}
