import { useWatch } from 'react-hook-form'
import { personInputSchema, type PersonView } from 'shared'
import { z } from 'zod'
import { useAddPerson } from '../../api/people'
import { CheckField } from '../../components/fields/check-field'
import { FieldGrid } from '../../components/fields/field-grid'
import { Form } from '../../components/fields/form'
import { MoneyField } from '../../components/fields/money-field'
import { NumberField } from '../../components/fields/number-field'
import { SubmitButton } from '../../components/fields/submit-button'
import { TextField } from '../../components/fields/text-field'
import { readSchema } from '../../components/fields/read-schema'
import { useSchemaForm } from '../../components/fields/use-schema-form'
import { RoleChoice } from './role-choice'

type PersonFields = Partial<z.input<typeof personInputSchema>> & { checksDesigns: boolean }

/** The tick only opens the boxes of the limits; the server is sent limits or none. */
const formSchema = readSchema(personInputSchema, ({ checksDesigns, ...typed }: PersonFields) => ({
  ...typed,
  roles: typed.roles?.length ? typed.roles : undefined,
  approvalLimits: checksDesigns ? (typed.approvalLimits ?? {}) : null,
}))

export interface AddedPerson {
  person: PersonView
  /** None when the person has a password from another district already. */
  temporaryPassword: string | null
}

interface PersonFormProps {
  onAdded: (added: AddedPerson) => void
}

export function PersonForm({ onAdded }: PersonFormProps) {
  const add = useAddPerson()
  const form = useSchemaForm(formSchema, { name: '', email: '', roles: [], checksDesigns: false })
  const checksDesigns = useWatch({ control: form.control, name: 'checksDesigns' })
  return (
    <Form
      form={form}
      problem={add.error}
      label="New person"
      onSubmit={async (values) => onAdded(await add.mutateAsync(values))}
    >
      <FieldGrid>
        <TextField name="name" label="Name" />
        <TextField name="email" label="E-mail" type="email" />
      </FieldGrid>
      <RoleChoice />
      <CheckField
        name="checksDesigns"
        label="Checks designs of others"
        hint="A design within all four limits may be checked by this person. Nobody checks their own."
      />
      {checksDesigns && (
        <FieldGrid column={200}>
          <NumberField name="approvalLimits.maximumHead" label="Animals, at most" unit="head" />
          <NumberField
            name="approvalLimits.maximumDrainageAcres"
            label="Drained area, at most"
            unit="acres"
          />
          <NumberField name="approvalLimits.maximumFillHeightFt" label="Height of fill, at most" unit="ft" />
          <MoneyField name="approvalLimits.maximumCost" label="Cost, at most" />
        </FieldGrid>
      )}
      <div style={{ marginTop: 16 }}>
        <SubmitButton words="Add this person" busyWords="Adding…" />
      </div>
    </Form>
  )
}
