import InputBase from '@mui/material/InputBase'
import type { HTMLInputAutoCompleteAttribute } from 'react'
import { FieldFrame, describedBy, type FieldWords } from './field-frame'
import { useField } from './use-field'

interface TextFieldProps extends FieldWords {
  name: string
  type?: 'text' | 'email' | 'password' | 'date' | 'search' | 'tel'
  autoComplete?: HTMLInputAutoCompleteAttribute
  inputMode?: 'numeric' | 'text'
  /** Lines shown; more than one makes a box for several lines. */
  rows?: number
  isOptional?: boolean
}

export function TextField({ name, label, hint, unit, isOptional, rows, ...input }: TextFieldProps) {
  const { id, field, error } = useField(name, label)
  return (
    <FieldFrame id={id} label={label} hint={hint} unit={unit} error={error} isOptional={isOptional}>
      <InputBase
        id={id}
        name={name}
        inputRef={field.ref}
        value={typeof field.value === 'string' ? field.value : ''}
        onChange={(event) => {
          const typed = event.target.value
          field.onChange(isOptional && typed.trim() === '' ? undefined : typed)
        }}
        onBlur={field.onBlur}
        error={error !== undefined}
        multiline={rows !== undefined && rows > 1}
        minRows={rows}
        fullWidth
        type={input.type ?? 'text'}
        autoComplete={input.autoComplete ?? 'off'}
        slotProps={{
          input: {
            inputMode: input.inputMode,
            'aria-describedby': describedBy(id, hint, error),
            'aria-invalid': error !== undefined,
          },
        }}
        sx={rows ? { py: 2, alignItems: 'flex-start' } : undefined}
      />
    </FieldFrame>
  )
}
