import Box from '@mui/material/Box'
import type { NoteView } from 'shared'
import { useSettleNote } from '../../api/notes'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'

interface SettleNoteProps {
  jobId: string
  note: Pick<NoteView, 'id' | 'author'>
}

export function SettleNote({ jobId, note }: SettleNoteProps) {
  const settle = useSettleNote(jobId, note.id)
  return (
    <Box sx={{ mt: 2 }}>
      <ProblemAlert error={settle.error} />
      <ActButton
        words={`Settle the note of ${note.author}`}
        busyWords="Settling…"
        isBusy={settle.isPending}
        onAct={() => settle.mutate()}
      />
    </Box>
  )
}
