import InputBase from '@mui/material/InputBase'
import { useState } from 'react'
import { describedBy, FieldFrame } from '../../components/fields/field-frame'
import { useField } from '../../components/fields/use-field'

const LABEL = 'Practices it pays for'
const HINT = 'Numbers such as 382, 561. Left empty: every practice of its lines.'

const numbersIn = (typed: string): string[] => typed.split(/[\s,;]+/).filter((part) => part !== '')

/** Practice numbers in one box; the form holds them as a list, or none. */
export function PracticesField() {
  const { id, field, error } = useField('practices', LABEL)
  const [typed, setTyped] = useState(() => (Array.isArray(field.value) ? field.value.join(', ') : ''))
  return (
    <FieldFrame id={id} label={LABEL} hint={HINT} error={error}>
      <InputBase
        id={id}
        name="practices"
        inputRef={field.ref}
        value={typed}
        onChange={({ target }) => {
          setTyped(target.value)
          const numbers = numbersIn(target.value)
          field.onChange(numbers.length === 0 ? undefined : numbers)
        }}
        onBlur={field.onBlur}
        error={error !== undefined}
        fullWidth
        slotProps={{ input: { 'aria-describedby': describedBy(id, HINT, error) } }}
      />
    </FieldFrame>
  )
}
