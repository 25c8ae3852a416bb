import Typography from '@mui/material/Typography'
import { LinkButton } from '../components/layout/link-button'
import { Page } from '../components/layout/page'

export function NotFoundPage() {
  return (
    <Page title="There is nothing at this address">
      <Typography sx={{ my: 4 }}>The address may be mistyped, or the thing is not yours to see.</Typography>
      <LinkButton to="/desk" words="Go to your desk" isMain />
    </Page>
  )
}
