import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import { useRouteError } from 'react-router-dom'

/** Shown in place of a page that could not be shown; a newer release on the server is the usual cause. */
export function ErrorPage() {
  const error = useRouteError()
  const isMissingFile = error instanceof TypeError && /import|fetch/i.test(error.message)
  return (
    <Box component="main" sx={{ p: 6, maxWidth: 640 }} role="alert">
      <Typography variant="h1">This page could not be shown</Typography>
      <Typography sx={{ my: 4 }}>
        {isMissingFile
          ? 'A part of it did not arrive. Either the line is down, or Wadestone was renewed while you worked.'
          : 'Something went wrong while it was drawn. What you saved before is safe.'}
      </Typography>
      <Button variant="contained" color="primary" onClick={() => window.location.reload()}>
        Load it again
      </Button>
    </Box>
  )
}
