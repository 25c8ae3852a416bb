import Box from '@mui/material/Box'

interface DemoBandProps {
  words: string
}

/** Every page of a demo district says so. */
export function DemoBand({ words }: DemoBandProps) {
  return (
    <Box
      role="note"
      sx={{
        bgcolor: (theme) => theme.tokens.leaf,
        borderBottom: 1,
        borderColor: 'divider',
        px: { xs: 4, md: 6 },
        py: 1,
      }}
    >
      {words}
    </Box>
  )
}
