import Typography from '@mui/material/Typography'

interface StatusLineProps {
  words: string | null
}

/** What just happened, told once to those who listen and quietly to those who look. */
export function StatusLine({ words }: StatusLineProps) {
  return (
    <Typography role="status" variant="body2" sx={{ color: 'success.main', minHeight: 20, fontWeight: 600 }}>
      {words}
    </Typography>
  )
}
