import { useEffect } from 'react'
import { jobInputSchema, waterBodies, type JobView } from 'shared'
import { useMakeJob } from '../../api/jobs'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { SelectField } from '../../components/fields/select-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'

const bodyChoices = waterBodies.map((body) => ({ value: body, label: body }))

interface NewJobFormProps {
  producerIds: string[]
  onMade: (job: JobView) => void
}

export function NewJobForm({ producerIds, onMade }: NewJobFormProps) {
  const make = useMakeJob()
  const form = useSchemaForm(jobInputSchema, {
    title: '',
    producerIds,
    body: 'pond',
    waterName: '',
    county: '',
  })
  const { setValue } = form
  // Looked at anew once somebody has pressed: the sentence that asked for a producer goes when there is one.
  const { isSubmitted } = form.formState
  useEffect(
    () => setValue('producerIds', producerIds, { shouldValidate: isSubmitted }),
    [setValue, producerIds, isSubmitted],
  )
  return (
    <Form
      form={form}
      problem={make.error}
      label="New job"
      onSubmit={async (values) => onMade(await make.mutateAsync(values))}
    >
      <FieldGrid>
        <TextField name="title" label="Name of the job" hint="Such as the farm and which water" />
        <SelectField name="body" label="Kind of water" choices={bodyChoices} />
        <TextField name="waterName" label="Name of the water" hint="As people there call it" />
        <TextField name="county" label="County" />
        <TextField name="farmNumber" label="Farm number" isOptional />
        <TextField name="tractNumber" label="Tract number" isOptional />
        <TextField name="fieldNumber" label="Field number" isOptional />
        <TextField name="legalDescription" label="Legal description or place" isOptional />
      </FieldGrid>
      <SubmitButton words="Make the job" busyWords="Making…" />
    </Form>
  )
}
