import Box from '@mui/material/Box'
import { useMemo } from 'react'
import { noteAnswerSchema, type NoteView } from 'shared'
import { z } from 'zod'
import { useAnswerNote } from '../../api/notes'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface AnswerFormProps {
  jobId: string
  note: Pick<NoteView, 'id' | 'author'>
}

/** Many stand on one page, so each field carries the id of its note in its name. */
export function AnswerForm({ jobId, note }: AnswerFormProps) {
  const answer = useAnswerNote(jobId, note.id)
  const schema = useMemo(() => z.object({ [note.id]: noteAnswerSchema }), [note.id])
  const form = useSchemaForm(schema, { [note.id]: { text: '' } })
  return (
    <Form
      form={form}
      problem={answer.error}
      label={`Answer to ${note.author}`}
      onSubmit={async (values) => {
        await answer.mutateAsync({ text: values[note.id]?.text ?? '' })
        form.reset()
      }}
    >
      <Box sx={{ display: 'grid', gap: 3, my: 3, maxWidth: 560 }}>
        <TextField name={`${note.id}.text`} label="Answer" rows={2} />
        <div>
          <SubmitButton words="Answer" busyWords="Answering…" />
        </div>
      </Box>
    </Form>
  )
}
