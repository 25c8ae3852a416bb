import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface LinkRowProps {
  children: ReactNode
}

/** Links beside each other, each as high as a thumb. */
export function LinkRow({ children }: LinkRowProps) {
  return (
    <Box
      sx={{
        display: 'flex',
        flexWrap: 'wrap',
        columnGap: 6,
        '& > a': { display: 'inline-flex', alignItems: 'center', minHeight: 44 },
      }}
    >
      {children}
    </Box>
  )
}
