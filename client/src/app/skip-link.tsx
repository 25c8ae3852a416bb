import Box from '@mui/material/Box'

interface SkipLinkProps {
  words: string
}

/** First thing the Tab key reaches; seen only then. */
export function SkipLink({ words }: SkipLinkProps) {
  return (
    <Box
      component="a"
      href="#main"
      onClick={() => document.getElementById('main')?.focus()}
      sx={{
        position: 'absolute',
        left: 8,
        top: -80,
        bgcolor: 'background.paper',
        border: 1,
        p: 2,
        zIndex: 10,
        '&:focus': { top: 8 },
      }}
    >
      {words}
    </Box>
  )
}
