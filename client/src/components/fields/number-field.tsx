import InputBase from '@mui/material/InputBase'
import { useState } from 'react'
import { FieldFrame, describedBy, type FieldWords } from './field-frame'
import { parseQuantity } from './parse-quantity'
import { useField } from './use-field'

interface NumberFieldProps extends FieldWords {
  name: string
  isOptional?: boolean
  /** Reads what was typed; a station is written 0+40. */
  parse?: (typed: string) => number | undefined
  write?: (value: number) => string
}

const writePlain = (value: number): string => String(value)

/**
 * A number typed as text, so that nothing typed ever vanishes: what cannot be read stays in the box and in the form
 * as it was typed, and the schema says what would be right.
 */
export function NumberField(props: NumberFieldProps) {
  const { name, label, hint, unit, isOptional, parse = parseQuantity, write = writePlain } = props
  const { id, field, error } = useField(name, label)
  const [typed, setTyped] = useState('')

  const meaning = (text: string): unknown =>
    text.trim() === '' ? undefined : (parse(text.trim()) ?? text.trim())
  const written = typeof field.value === 'number' ? write(field.value) : String(field.value ?? '')
  // What was typed stands as it was typed, unless the form was filled from elsewhere since.
  const shown = meaning(typed) === field.value ? typed : written

  return (
    <FieldFrame id={id} label={label} hint={hint} unit={unit} error={error} isOptional={isOptional}>
      <InputBase
        id={id}
        name={name}
        inputRef={field.ref}
        value={shown}
        onChange={(event) => {
          setTyped(event.target.value)
          field.onChange(meaning(event.target.value))
        }}
        onBlur={field.onBlur}
        error={error !== undefined}
        autoComplete="off"
        slotProps={{
          input: {
            'aria-describedby': describedBy(id, hint, error),
            'aria-invalid': error !== undefined,
            style: { textAlign: 'right', fontVariantNumeric: 'tabular-nums lining-nums' },
          },
        }}
        sx={{ width: 128, flex: 'none' }}
      />
    </FieldFrame>
  )
}
