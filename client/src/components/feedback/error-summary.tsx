import Box from '@mui/material/Box'
import Link from '@mui/material/Link'
import Typography from '@mui/material/Typography'
import type { Ref } from 'react'
import { fieldId } from '../fields/field-id'
import type { FlatError } from '../fields/flat-errors'

interface ErrorSummaryProps {
  errors: readonly FlatError[]
  labels: ReadonlyMap<string, string>
  ref?: Ref<HTMLDivElement>
}

const leadTo = (name: string) => {
  const id = fieldId(name)
  // A group such as a table of rows has no control of its own: its first one will do.
  const control = document.getElementById(id) ?? document.querySelector<HTMLElement>(`[id^="${id}-"]`)
  control?.focus()
  control?.scrollIntoView?.({ block: 'center' })
}

/** What needs another look, on top of the form; it takes the focus, and each line leads to its field. */
export function ErrorSummary({ errors, labels, ref }: ErrorSummaryProps) {
  return (
    <Box
      ref={ref}
      role="alert"
      tabIndex={-1}
      sx={{ border: 2, borderColor: 'error.main', p: 4, my: 4, maxWidth: 720 }}
    >
      <Typography variant="h3" component="h2">
        {errors.length === 1 ? 'One field needs another look' : `${errors.length} fields need another look`}
      </Typography>
      <Box component="ul" sx={{ m: 0, mt: 2, pl: 5 }}>
        {errors.map(({ name, message }) => (
          <li key={name}>
            <Link
              href={`#${fieldId(name)}`}
              onClick={(event) => {
                event.preventDefault()
                leadTo(name)
              }}
              sx={{ color: 'error.main', fontWeight: 600 }}
            >
              {labels.has(name) ? `${labels.get(name)}: ${message}` : message}
            </Link>
          </li>
        ))}
      </Box>
    </Box>
  )
}
