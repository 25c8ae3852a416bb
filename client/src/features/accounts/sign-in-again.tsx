import Dialog from '@mui/material/Dialog'
import DialogContent from '@mui/material/DialogContent'
import Typography from '@mui/material/Typography'
import { useSyncExternalStore } from 'react'
import { sessionExpired } from '../../api/session-expired'
import { SignInForm } from './sign-in-form'

interface SignInAgainProps {
  email: string
}

/** Over the page in hand when the session has ended: nothing typed below it is lost. */
export function SignInAgain({ email }: SignInAgainProps) {
  const isExpired = useSyncExternalStore(sessionExpired.subscribe, sessionExpired.read)
  return (
    <Dialog open={isExpired} aria-labelledby="sign-in-again">
      <DialogContent>
        <Typography variant="h2" id="sign-in-again">
          Sign in once more
        </Typography>
        <Typography>Your session has ended. The page below and all you typed stay as they are.</Typography>
        <SignInForm email={email} onDone={() => undefined} />
      </DialogContent>
    </Dialog>
  )
}
