import Button from '@mui/material/Button'
import { useSignOut } from '../../api/session'

export function SignOutButton() {
  const signOut = useSignOut()
  return (
    <Button
      aria-disabled={signOut.isPending}
      onClick={() => {
        if (!signOut.isPending) signOut.mutate()
      }}
    >
      {signOut.isPending ? 'Signing out…' : 'Sign out'}
    </Button>
  )
}
