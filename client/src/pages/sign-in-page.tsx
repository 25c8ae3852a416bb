import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useNavigate, useSearchParams } from 'react-router-dom'
import { Page } from '../components/layout/page'
import { safeReturnPath } from '../features/accounts/safe-return-path'
import { SignInForm } from '../features/accounts/sign-in-form'

export function SignInPage() {
  const navigate = useNavigate()
  const [query] = useSearchParams()
  return (
    <Box component="main" id="main" sx={{ maxWidth: 720, mx: 'auto', pt: { xs: 6, md: 20 } }}>
      <Box sx={{ px: { xs: 4, md: 6 }, display: 'flex', gap: 2, alignItems: 'center', mb: 4 }}>
        <img src="/wadestone.svg" width="36" height="36" alt="" />
        <Typography variant="h1" component="p">
          Wadestone
        </Typography>
      </Box>
      <Page title="Sign in">
        <Typography>
          Design a rock watering ramp, price it, fund it, sign it, approve it and send it.
        </Typography>
        <SignInForm onDone={() => void navigate(safeReturnPath(query.get('to')), { replace: true })} />
        <Typography sx={{ color: 'text.secondary' }}>
          Landowners need no password: open the link in the mail from your district.
        </Typography>
      </Page>
    </Box>
  )
}
