import type { ProducerView } from 'shared'
import { useAddProducer } from '../../api/people'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { ProducerFields } from './producer-fields'
import { producerFormSchema } from './producer-form-schema'

interface ProducerFormProps {
  onAdded: (producer: ProducerView) => void
  isQuiet?: boolean
}

export function ProducerForm({ onAdded, isQuiet = false }: ProducerFormProps) {
  const add = useAddProducer()
  const form = useSchemaForm(producerFormSchema, { name: '', farmName: '', hasAddress: false })
  return (
    <Form
      form={form}
      problem={add.error}
      label="New producer"
      onSubmit={async (values) => {
        onAdded(await add.mutateAsync(values))
        form.reset()
      }}
    >
      <ProducerFields />
      <SubmitButton words="Add this producer" busyWords="Adding…" isQuiet={isQuiet} />
    </Form>
  )
}
