import Box from '@mui/material/Box'
import type { NoteView } from 'shared'
import { EmptyState } from '../../components/feedback/empty-state'
import { Section } from '../../components/layout/section'
import { NoteItem } from './note-item'

interface NoteListProps {
  jobId: string
  notes: readonly NoteView[]
}

/** What waits for an answer first; what is settled stays readable below. */
export function NoteList({ jobId, notes }: NoteListProps) {
  if (notes.length === 0) {
    return (
      <EmptyState title="No notes">
        A note stays with the job until somebody settles it. A packet goes out when none is open.
      </EmptyState>
    )
  }
  const open = notes.filter(({ status }) => status !== 'settled')
  const settled = notes.filter(({ status }) => status === 'settled')
  return (
    <>
      <Section title="Open" aside={countText(open.length)}>
        {open.length === 0 ? <p>Every note is settled.</p> : <Notes jobId={jobId} notes={open} />}
      </Section>
      {settled.length > 0 && (
        <Section title="Settled" aside={countText(settled.length)}>
          <Notes jobId={jobId} notes={settled} />
        </Section>
      )}
    </>
  )
}

const countText = (count: number): string => (count === 1 ? '1 note' : `${count} notes`)

function Notes({ jobId, notes }: NoteListProps) {
  return (
    <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
      {notes.map((note) => (
        <NoteItem key={note.id} jobId={jobId} note={note} />
      ))}
    </Box>
  )
}
