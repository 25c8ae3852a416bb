import InputBase from '@mui/material/InputBase'
import NativeSelect from '@mui/material/NativeSelect'
import { FieldFrame, describedBy, type FieldWords } from './field-frame'
import { useField } from './use-field'

export interface Choice {
  value: string
  label: string
}

interface SelectFieldProps extends FieldWords {
  name: string
  choices: readonly Choice[]
  /** Words of the empty choice; left out when one must be chosen and one is chosen already. */
  emptyLabel?: string
  isOptional?: boolean
}

export function SelectField({ name, choices, emptyLabel, isOptional, ...words }: SelectFieldProps) {
  const { label, hint } = words
  const { id, field, error } = useField(name, label)
  return (
    <FieldFrame id={id} {...words} error={error} isOptional={isOptional}>
      <NativeSelect
        input={<InputBase />}
        id={id}
        inputRef={field.ref}
        value={typeof field.value === 'string' ? field.value : ''}
        onChange={(event) => field.onChange(event.target.value === '' ? undefined : event.target.value)}
        onBlur={field.onBlur}
        error={error !== undefined}
        inputProps={{ id, name, 'aria-describedby': describedBy(id, hint, error) }}
        sx={{ minWidth: 128, maxWidth: '100%' }}
      >
        {(emptyLabel !== undefined || field.value === undefined) && (
          <option value="">{emptyLabel ?? 'Choose'}</option>
        )}
        {choices.map((choice) => (
          <option key={choice.value} value={choice.value}>
            {choice.label}
          </option>
        ))}
      </NativeSelect>
    </FieldFrame>
  )
}
