import { designInputSchema, type DesignView } from 'shared'
import { z } from 'zod'
import { useMakeDesign } from '../../api/designs'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { SelectField } from '../../components/fields/select-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

const EMPTY = 'empty'

const newDesignSchema = z.strictObject({ name: designInputSchema.shape.name, from: z.string() })

interface NewDesignFormProps {
  jobId: string
  designs: readonly DesignView[]
  onMade: (design: DesignView) => void
}

/** Another design of the job: from nothing, or from one that is there. */
export function NewDesignForm({ jobId, designs, onMade }: NewDesignFormProps) {
  const make = useMakeDesign(jobId)
  const form = useSchemaForm(newDesignSchema, { name: '', from: EMPTY })
  const choices = [
    { value: EMPTY, label: 'Nothing' },
    ...designs.map(({ id, name }) => ({ value: id, label: `A copy of ${name}` })),
  ]
  return (
    <Form
      form={form}
      problem={make.error}
      label="New design"
      onSubmit={async ({ name, from }) => {
        const plan = designs.find(({ id }) => id === from)?.plan ?? { inputVersion: 1 as const }
        onMade(await make.mutateAsync({ name, plan }))
      }}
    >
      <FieldGrid>
        <TextField name="name" label="Name" hint="Such as what sets it apart" />
        <SelectField name="from" label="Begin from" choices={choices} />
      </FieldGrid>
      <SubmitButton words="Make the design" busyWords="Making…" isQuiet={designs.length > 0} />
    </Form>
  )
}
