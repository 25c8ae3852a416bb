import Button from '@mui/material/Button'
import Dialog from '@mui/material/Dialog'
import DialogActions from '@mui/material/DialogActions'
import DialogContent from '@mui/material/DialogContent'
import DialogTitle from '@mui/material/DialogTitle'
import { useEffect } from 'react'
import { useBlocker } from 'react-router-dom'

interface LeaveGuardProps {
  hasUnsaved: boolean
  /** Pages whose address begins so share what was typed; between them nothing is lost. */
  within?: string
}

/** Asks before what was typed is left behind, on the way to another page or out of the window. */
export function LeaveGuard({ hasUnsaved, within }: LeaveGuardProps) {
  const blocker = useBlocker(({ currentLocation, nextLocation }) => {
    if (!hasUnsaved || currentLocation.pathname === nextLocation.pathname) return false
    return within === undefined || !nextLocation.pathname.startsWith(within)
  })

  useEffect(() => {
    if (!hasUnsaved) return undefined
    const ask = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', ask)
    return () => window.removeEventListener('beforeunload', ask)
  }, [hasUnsaved])

  return (
    <Dialog open={blocker.state === 'blocked'} onClose={() => blocker.reset?.()}>
      <DialogTitle>Not saved yet</DialogTitle>
      <DialogContent>What you typed here is not saved. It is lost when you leave.</DialogContent>
      <DialogActions>
        <Button onClick={() => blocker.proceed?.()}>Leave without saving</Button>
        <Button variant="contained" color="primary" autoFocus onClick={() => blocker.reset?.()}>
          Stay here
        </Button>
      </DialogActions>
    </Dialog>
  )
}
