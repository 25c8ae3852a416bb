import Button from '@mui/material/Button'
import type { ProducerView } from 'shared'
import { useSaveProducer } from '../../api/people'
import { ProblemError } from '../../api/problem-error'
import type { Versioned } from '../../api/request'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { ProducerFields } from './producer-fields'
import { producerFormSchema, type ProducerTyped } from './producer-form-schema'

interface ChangeProducerFormProps {
  loaded: Versioned<ProducerView>
  onSaved: (producer: ProducerView) => void
  /** Shows what is saved now, when somebody else saved in between. */
  onReload: () => void
}

const typedOf = ({ name, farmName, email, phone, address }: ProducerView): ProducerTyped => ({
  ...{ name, farmName, email, phone, address },
  hasAddress: address !== undefined,
})

/** What the district knows of a producer, put right. A packet that is made keeps what it was made with. */
export function ChangeProducerForm({ loaded, onSaved, onReload }: ChangeProducerFormProps) {
  const { version, view } = loaded
  const save = useSaveProducer(view.id)
  const form = useSchemaForm(producerFormSchema, typedOf(view))
  const isStale = save.error instanceof ProblemError && save.error.slug === 'stale-version'
  return (
    <Form
      form={form}
      problem={save.error}
      label={`Change ${view.name}`}
      onSubmit={async (body) => onSaved((await save.mutateAsync({ body, version })).view)}
    >
      {isStale && <Button onClick={onReload}>Drop what I typed and show what is saved</Button>}
      <ProducerFields />
      <SubmitButton words="Save the producer" busyWords="Saving…" />
    </Form>
  )
}
