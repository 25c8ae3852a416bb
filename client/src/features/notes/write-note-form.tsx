import Box from '@mui/material/Box'
import { noteInputSchema } from 'shared'
import { useWriteNote } from '../../api/notes'
import { StatusLine } from '../../components/feedback/status-line'
import { Form } from '../../components/fields/form'
import { NumberField } from '../../components/fields/number-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface WriteNoteFormProps {
  jobId: string
  /** The packet a page number belongs to; null while there is none. */
  packetId: string | null
}

export function WriteNoteForm({ jobId, packetId }: WriteNoteFormProps) {
  const write = useWriteNote(jobId)
  const empty = { text: '', page: undefined, ...(packetId === null ? {} : { packetId }) }
  const form = useSchemaForm(noteInputSchema, empty)
  return (
    <Form
      form={form}
      problem={write.error}
      label="New note"
      onSubmit={async (values) => {
        await write.mutateAsync(values)
        form.reset(empty)
      }}
    >
      <Box sx={{ display: 'grid', gap: 4, my: 4, maxWidth: 560 }}>
        <TextField name="text" label="Note" hint="What should be looked at, and where" rows={3} />
        {packetId !== null && <NumberField name="page" label="Page of the packet" isOptional />}
        <div>
          <SubmitButton words="Write the note" busyWords="Writing…" isQuiet />
        </div>
      </Box>
      <StatusLine words={write.isSuccess && !form.formState.isDirty ? 'The note is written.' : null} />
    </Form>
  )
}
