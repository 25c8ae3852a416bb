import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface FootBarProps {
  children: ReactNode
}

/** The act of a page stays in view at the foot of the screen, with what still blocks it. */
export function FootBar({ children }: FootBarProps) {
  return (
    <Box
      sx={{
        position: 'sticky',
        bottom: 0,
        zIndex: 1,
        bgcolor: 'background.default',
        borderTop: 1,
        borderColor: 'text.primary',
        mx: { xs: -4, md: 0 },
        px: { xs: 4, md: 0 },
        py: 3,
        mt: 6,
        display: 'grid',
        gap: 2,
        '& .MuiButton-contained, & .MuiButton-outlined': { minHeight: 48, flex: '1 1 160px' },
      }}
    >
      {children}
    </Box>
  )
}
