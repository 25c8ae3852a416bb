import Button from '@mui/material/Button'
import Dialog from '@mui/material/Dialog'
import DialogActions from '@mui/material/DialogActions'
import DialogContent from '@mui/material/DialogContent'
import Typography from '@mui/material/Typography'
import { useId, useState, type ReactNode } from 'react'
import { ActButton } from './act-button'
import { ProblemAlert } from './problem-alert'

interface InForceButtonProps {
  /** What the button says. */
  words: string
  /** What is put in force. */
  name: string
  reasons?: readonly string[]
  put: {
    isPending: boolean
    error: Error | null
    mutate: (nothing: undefined, then: { onSuccess: () => void }) => void
  }
  /** What follows from it, and what is still missing. */
  children: ReactNode
}

/** An act that cannot be undone: it asks once more, and says what follows. */
export function InForceButton({ words, name, reasons, put, children }: InForceButtonProps) {
  const [isAsking, setIsAsking] = useState(false)
  const titleId = useId()
  const close = () => setIsAsking(false)
  return (
    <>
      <ActButton words={words} reasons={reasons} isMain onAct={() => setIsAsking(true)} />
      <Dialog open={isAsking} onClose={close} aria-labelledby={titleId}>
        <DialogContent>
          <Typography variant="h2" id={titleId}>
            Put {name} in force?
          </Typography>
          {children}
          <ProblemAlert error={put.error} />
        </DialogContent>
        <DialogActions>
          <Button onClick={close}>Not yet</Button>
          <Button
            variant="contained"
            color="primary"
            aria-disabled={put.isPending}
            onClick={() => {
              if (!put.isPending) put.mutate(undefined, { onSuccess: close })
            }}
          >
            {put.isPending ? 'Putting in force…' : 'Put in force for good'}
          </Button>
        </DialogActions>
      </Dialog>
    </>
  )
}
