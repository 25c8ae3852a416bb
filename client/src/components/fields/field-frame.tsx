import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'

export interface FieldWords {
  label: string
  hint?: ReactNode
  /** Shown after the box and told to screen readers with the label. */
  unit?: string
}

interface FieldFrameProps extends FieldWords {
  id: string
  error?: string
  isOptional?: boolean
  children: ReactNode
}

export const hintId = (id: string) => `${id}-hint`
export const errorId = (id: string) => `${id}-error`

/** What a control is described by, so that hint and error are read with it. */
export const describedBy = (id: string, hint: ReactNode, error: string | undefined): string | undefined =>
  [hint ? hintId(id) : null, error ? errorId(id) : null].filter(Boolean).join(' ') || undefined

/** Label above, hint under it, control, unit after it, error last. */
export function FieldFrame({ id, label, hint, unit, error, isOptional, children }: FieldFrameProps) {
  return (
    <Box sx={{ minWidth: 0 }}>
      <Typography component="label" htmlFor={id} sx={{ display: 'block', fontWeight: 600 }}>
        {label}
        {unit && <span className="visually-hidden">, {unit}</span>}
        {isOptional && (
          <Typography component="span" sx={{ color: 'text.secondary' }}>
            {' '}
            (if known)
          </Typography>
        )}
      </Typography>
      {hint && (
        <Typography id={hintId(id)} variant="body2" sx={{ color: 'text.secondary' }}>
          {hint}
        </Typography>
      )}
      <Box sx={{ display: 'flex', alignItems: 'center', gap: 2, mt: 1 }}>
        {children}
        {unit && (
          <Typography
            component="label"
            htmlFor={id}
            aria-hidden
            sx={{ color: 'text.secondary', whiteSpace: 'nowrap' }}
          >
            {unit}
          </Typography>
        )}
      </Box>
      {error && (
        <Typography id={errorId(id)} variant="body2" sx={{ color: 'error.main', fontWeight: 600, mt: 1 }}>
          {error}
        </Typography>
      )}
    </Box>
  )
}
