import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import { designInputSchema, type DesignView } from 'shared'
import { z } from 'zod'
import { useSaveDesign } from '../../api/designs'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useFilledForm } from '../../components/fields/use-filled-form'

const renameSchema = z.strictObject({ newName: designInputSchema.shape.name })

interface RenameDesignFormProps {
  design: DesignView
  onDone: () => void
}

export function RenameDesignForm({ design, onDone }: RenameDesignFormProps) {
  const save = useSaveDesign(design.jobId, design.id)
  const { form } = useFilledForm(renameSchema, { newName: design.name })
  return (
    <Form
      form={form}
      problem={save.error}
      label={`Rename ${design.name}`}
      onSubmit={async ({ newName }) => {
        await save.mutateAsync({ body: { name: newName, plan: design.plan }, version: design.version })
        onDone()
      }}
    >
      <TextField name="newName" label="New name" />
      <Box sx={{ display: 'flex', gap: 3, mt: 2 }}>
        <SubmitButton words="Rename" busyWords="Renaming…" isQuiet />
        <Button variant="text" onClick={onDone}>
          Keep the name
        </Button>
      </Box>
    </Form>
  )
}
