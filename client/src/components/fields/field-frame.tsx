import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'

export interface FieldWords {
  label: string
  hint?: ReactNode
  /** Shown after the box and told to screen readers with the label. */
  unit?: string
  /** The heads of a table say it already; it is still told to screen readers. */
  isLabelHidden?: boolean
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

/** Label above, hint under it, control, unit after it, error last: three rows that a grid of fields lines up. */
export function FieldFrame({ id, error, children, ...words }: FieldFrameProps) {
  const { unit } = words
  return (
    <Box className="field-frame" sx={{ minWidth: 0 }}>
      <FieldHead id={id} {...words} />
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

type FieldHeadProps = FieldWords & Pick<FieldFrameProps, 'id' | 'isOptional'>

function FieldHead({ id, label, hint, unit, isOptional, isLabelHidden }: FieldHeadProps) {
  return (
    <Box sx={{ alignSelf: 'end' }}>
      <Typography
        component="label"
        htmlFor={id}
        className={isLabelHidden ? 'visually-hidden' : undefined}
        sx={isLabelHidden ? undefined : { display: 'block', fontWeight: 600 }}
      >
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
    </Box>
  )
}
