import Box from '@mui/material/Box'
import { technicalCheckSchema } from 'shared'
import { useTechnicalCheck } from '../../api/packets'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

interface TechnicalCheckFormProps {
  packetId: string
  revision: number
}

export function TechnicalCheckForm({ packetId, revision }: TechnicalCheckFormProps) {
  const check = useTechnicalCheck(packetId)
  const form = useSchemaForm(technicalCheckSchema, {})
  return (
    <Form
      form={form}
      problem={check.error}
      label="Technical check"
      onSubmit={(values) => check.mutateAsync(values)}
    >
      <Box sx={{ display: 'grid', gap: 4, my: 4, maxWidth: 560 }}>
        <TextField
          name="note"
          label="Note"
          hint="What you looked at, if it should stand in the record. Leave it empty otherwise."
          rows={3}
          isOptional
        />
        <div>
          <SubmitButton words={`Record my check of revision ${revision}`} busyWords="Recording…" />
        </div>
      </Box>
    </Form>
  )
}
