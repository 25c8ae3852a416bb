import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useState } from 'react'
import type { NoteView } from 'shared'
import { useMay } from '../../api/session-context'
import { AnswerForm } from './answer-form'
import { SettleNote } from './settle-note'

interface NoteActsProps {
  jobId: string
  note: NoteView
}

/** What this person can do with an open note. The server says who may settle whose. */
export function NoteActs({ jobId, note }: NoteActsProps) {
  const may = useMay()
  const [wantsMore, setWantsMore] = useState(false)
  const isAnswered = note.answers.length > 0
  return (
    <>
      {may('note:answer') && (!isAnswered || wantsMore) && <AnswerForm jobId={jobId} note={note} />}
      <Box sx={{ mt: 2 }}>
        {may('note:answer') && isAnswered && !wantsMore && (
          <Button variant="text" onClick={() => setWantsMore(true)}>
            Answer {note.author} once more
          </Button>
        )}
        {may('note:write') && <SettleNote jobId={jobId} note={note} />}
      </Box>
    </>
  )
}
