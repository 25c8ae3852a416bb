import { producerInputSchema, type ProducerView } from 'shared'
import type { z } from 'zod'
import { useAddProducer } from '../../api/people'
import { CheckField } from '../../components/fields/check-field'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { readSchema } from '../../components/fields/read-schema'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { useWatch } from 'react-hook-form'

type ProducerTyped = z.input<typeof producerInputSchema> & { hasAddress: boolean }

/** The tick only opens the address boxes; the server is sent a whole address or none. */
const formSchema = readSchema(producerInputSchema, ({ hasAddress, address, ...rest }: ProducerTyped) =>
  hasAddress ? { ...rest, address: address ?? {} } : rest,
)

interface ProducerFormProps {
  onAdded: (producer: ProducerView) => void
  isQuiet?: boolean
}

export function ProducerForm({ onAdded, isQuiet = false }: ProducerFormProps) {
  const add = useAddProducer()
  const form = useSchemaForm(formSchema, { name: '', farmName: '', hasAddress: false })
  const hasAddress = useWatch({ control: form.control, name: 'hasAddress' })
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
      <FieldGrid>
        <TextField name="name" label="Name" hint="As it will be signed" />
        <TextField name="farmName" label="Farm or ranch" />
        <TextField
          name="email"
          label="E-mail"
          type="email"
          isOptional
          hint="Packets and links go here. Without one, the packet goes by post."
        />
        <TextField name="phone" label="Telephone" type="tel" isOptional />
      </FieldGrid>
      <CheckField name="hasAddress" label="Add the postal address" />
      {hasAddress && (
        <FieldGrid>
          <TextField name="address.street" label="Street or box" />
          <TextField name="address.town" label="Town" />
          <TextField name="address.region" label="State" />
          <TextField name="address.postalCode" label="Postal code" />
        </FieldGrid>
      )}
      <SubmitButton words="Add this producer" busyWords="Adding…" isQuiet={isQuiet} />
    </Form>
  )
}
