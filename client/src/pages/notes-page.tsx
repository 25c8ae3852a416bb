import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { jobQuery } from '../api/jobs'
import { notesQuery } from '../api/notes'
import { useMay } from '../api/session-context'
import { QueryGate } from '../components/feedback/query-gate'
import { Page } from '../components/layout/page'
import { Section } from '../components/layout/section'
import { NoteList } from '../features/notes/note-list'
import { WriteNoteForm } from '../features/notes/write-note-form'

export function NotesPage() {
  const { jobId = '' } = useParams()
  const may = useMay()
  const job = useQuery(jobQuery(jobId))
  const notes = useQuery(notesQuery(jobId))
  return (
    <Page title="Notes" maxWidth={960}>
      <QueryGate query={notes}>{(list) => <NoteList jobId={jobId} notes={list} />}</QueryGate>
      {may('note:write') && (
        <QueryGate query={job} lines={3}>
          {({ packetId }) => (
            <Section title="Write a note">
              <WriteNoteForm key={packetId} jobId={jobId} packetId={packetId} />
            </Section>
          )}
        </QueryGate>
      )}
    </Page>
  )
}
