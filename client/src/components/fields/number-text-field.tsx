import InputBase from '@mui/material/InputBase'
import { FieldFrame, describedBy, type FieldWords } from './field-frame'
import { useField } from './use-field'

interface NumberTextFieldProps extends FieldWords {
  name: string
  isOptional?: boolean
  /** Brings what was typed into the written form when the box is left. */
  tidy: (typed: string) => string
}

/** Figures that stay decimal strings: money and rates. */
export function NumberTextField({ name, isOptional, tidy, ...words }: NumberTextFieldProps) {
  const { label, hint } = words
  const { id, field, error } = useField(name, label)
  const store = (typed: string) => field.onChange(typed === '' ? undefined : typed)
  return (
    <FieldFrame id={id} {...words} error={error} isOptional={isOptional}>
      <InputBase
        id={id}
        name={name}
        inputRef={field.ref}
        value={typeof field.value === 'string' ? field.value : ''}
        onChange={(event) => store(event.target.value)}
        onBlur={(event) => {
          store(tidy(event.target.value.trim()))
          field.onBlur()
        }}
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
