import Checkbox from '@mui/material/Checkbox'
import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import { describedBy, errorId, hintId } from './field-frame'
import { useField } from './use-field'

interface CheckFieldProps {
  name: string
  label: string
  hint?: ReactNode
}

export function CheckField({ name, label, hint }: CheckFieldProps) {
  const { id, field, error } = useField(name, label)
  return (
    <Box sx={{ display: 'flex', gap: 2, alignItems: 'flex-start' }}>
      <Checkbox
        id={id}
        name={name}
        checked={field.value === true}
        onChange={(event) => field.onChange(event.target.checked)}
        onBlur={field.onBlur}
        slotProps={{ input: { ref: field.ref, 'aria-describedby': describedBy(id, hint, error) } }}
        sx={{ p: 1, ml: -1 }}
      />
      <Box sx={{ pt: '7px' }}>
        <label htmlFor={id}>{label}</label>
        {hint && (
          <Typography id={hintId(id)} variant="body2" sx={{ color: 'text.secondary' }}>
            {hint}
          </Typography>
        )}
        {error && (
          <Typography id={errorId(id)} variant="body2" sx={{ color: 'error.main', fontWeight: 600 }}>
            {error}
          </Typography>
        )}
      </Box>
    </Box>
  )
}
