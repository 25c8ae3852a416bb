import { useWatch } from 'react-hook-form'
import { CheckField } from '../../components/fields/check-field'
import { FieldGrid } from '../../components/fields/field-grid'
import { TextField } from '../../components/fields/text-field'
import type { ProducerTyped } from './producer-form-schema'

/** What the district knows of a producer; the boxes of the address open at a tick. */
export function ProducerFields() {
  const hasAddress = useWatch<ProducerTyped, 'hasAddress'>({ name: 'hasAddress' })
  return (
    <>
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
    </>
  )
}
