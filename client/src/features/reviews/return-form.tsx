import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { useMemo } from 'react'
import { useFieldArray } from 'react-hook-form'
import type { JobView, OfferedAction } from 'shared'
import { useAct } from '../../api/jobs'
import { ActButton } from '../../components/feedback/act-button'
import { Form } from '../../components/fields/form'
import { NumberField } from '../../components/fields/number-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { noteWords, returnSchema } from './return-schema'

interface ReturnFormProps {
  job: Pick<JobView, 'id'>
  offered: OfferedAction
  /** How many pages a note can point at. */
  pages: number
}

/** Back to the planner, with what should change, note by note. */
export function ReturnForm({ job, offered, pages }: ReturnFormProps) {
  const act = useAct(job.id)
  const schema = useMemo(() => returnSchema(pages), [pages])
  const form = useSchemaForm(schema, { notes: [{ text: '' }] })
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'notes' })
  if (!offered.enabled) {
    return <ActButton words={offered.words} reasons={offered.reasons} isBlocked onAct={() => undefined} />
  }
  return (
    <Form
      form={form}
      problem={act.error}
      label={offered.words}
      onSubmit={({ notes }) => act.mutateAsync({ action: 'return', notes: notes.map(noteWords) })}
    >
      {fields.map(({ id }, index) => (
        <Box
          key={id}
          role="group"
          aria-label={`Note ${index + 1}`}
          sx={{ display: 'grid', gap: 3, py: 3, borderBottom: 1, borderColor: 'divider' }}
        >
          <TextField name={`notes.${index}.text`} label={`Note ${index + 1}`} rows={2} />
          <NumberField name={`notes.${index}.page`} label="Page" isOptional />
          {fields.length > 1 && (
            <div>
              <Button variant="text" onClick={() => remove(index)}>
                Take note {index + 1} off
              </Button>
            </div>
          )}
        </Box>
      ))}
      <Button variant="text" onClick={() => append({ text: '' })}>
        One more note
      </Button>
      <Box sx={{ mt: 2 }}>
        <SubmitButton words={offered.words} busyWords="Returning…" isQuiet />
      </Box>
    </Form>
  )
}
