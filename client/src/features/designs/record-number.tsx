import InputBase from '@mui/material/InputBase'
import { useState } from 'react'
import { get, useController, useFormContext } from 'react-hook-form'
import { FieldFrame, describedBy } from '../../components/fields/field-frame'
import { fieldId } from '../../components/fields/field-id'
import { useFieldLabel } from '../../components/fields/form-labels'
import { parseQuantity } from '../../components/fields/parse-quantity'

interface RecordNumberProps {
  /** Path of the record. */
  name: string
  /** Its key; it may hold a dot, so it cannot be part of a path. */
  entry: string
  label: string
  unit: string
  isOptional?: boolean
}

const meaning = (text: string): unknown =>
  text.trim() === '' ? undefined : (parseQuantity(text) ?? text.trim())

/** One number of a record whose keys people name themselves. */
export function RecordNumber({ name, entry, label, unit, isOptional }: RecordNumberProps) {
  const { getValues } = useFormContext()
  const { field, formState } = useController({ name })
  const [typed, setTyped] = useState('')
  const id = fieldId(`${name}.${entry}`)
  useFieldLabel(`${name}.${entry}`, label)

  const record = (field.value ?? {}) as Readonly<Record<string, unknown>>
  const value = record[entry] ?? undefined
  const shown = meaning(typed) === value ? typed : String(value ?? '')
  const found: unknown = get(formState.errors, name)
  const error = (found as Readonly<Record<string, { message?: string }>> | undefined)?.[entry]?.message

  return (
    <FieldFrame id={id} label={label} unit={unit} error={error} isOptional={isOptional}>
      <InputBase
        id={id}
        value={shown}
        onChange={(event) => {
          setTyped(event.target.value)
          const latest = (getValues(name) ?? {}) as Readonly<Record<string, unknown>>
          field.onChange({ ...latest, [entry]: meaning(event.target.value) })
        }}
        onBlur={field.onBlur}
        error={error !== undefined}
        autoComplete="off"
        slotProps={{
          input: {
            'aria-describedby': describedBy(id, undefined, error),
            'aria-invalid': error !== undefined,
            style: { textAlign: 'right', fontVariantNumeric: 'tabular-nums lining-nums' },
          },
        }}
        sx={{ width: 128, flex: 'none' }}
      />
    </FieldFrame>
  )
}
