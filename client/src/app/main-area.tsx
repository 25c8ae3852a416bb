import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface MainAreaProps {
  children: ReactNode
}

export function MainArea({ children }: MainAreaProps) {
  return (
    <Box component="main" id="main" tabIndex={-1} sx={{ outline: 'none', pb: 12 }}>
      {children}
    </Box>
  )
}
