import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useState } from 'react'
import { StatusLine } from '../../components/feedback/status-line'
import { LinkButton } from '../../components/layout/link-button'
import type { AddedPerson } from './person-form'

interface PasswordOnceProps {
  added: AddedPerson
}

/** The password of a new person, to hand over. It is kept nowhere in a form that could be read again. */
export function PasswordOnce({ added: { person, temporaryPassword } }: PasswordOnceProps) {
  const [copied, setCopied] = useState<string | null>(null)
  const copy = async (password: string) => {
    try {
      await navigator.clipboard.writeText(password)
      setCopied('Copied.')
    } catch {
      setCopied('The browser did not let it be copied. Select it and copy it by hand.')
    }
  }
  if (!temporaryPassword) {
    return (
      <>
        <Typography sx={{ my: 4 }}>
          {person.name} signs in with the password used so far; now this district is there to choose as well.
        </Typography>
        <LinkButton to="/people" words="All people" isMain />
      </>
    )
  }
  return (
    <>
      <Typography sx={{ mt: 4 }}>
        Hand this password to {person.name} ({person.email}). It is shown only now; it can be changed under
        the own name after signing in.
      </Typography>
      <Box
        component="output"
        aria-label={`Password of ${person.name}`}
        sx={{
          display: 'block',
          my: 4,
          p: 4,
          border: 1,
          borderColor: 'text.primary',
          fontFamily: 'monospace',
          fontSize: '1.125rem',
          overflowWrap: 'anywhere',
          userSelect: 'all',
        }}
      >
        {temporaryPassword}
      </Box>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 3 }}>
        <Button variant="contained" color="primary" onClick={() => void copy(temporaryPassword)}>
          Copy the password
        </Button>
        <LinkButton to="/people" words="I have it, all people" />
      </Box>
      <StatusLine words={copied} />
    </>
  )
}
