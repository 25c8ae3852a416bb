import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface FieldGridProps {
  children: ReactNode
  /** Least width of a column in px. */
  column?: number
}

/** Fields side by side where there is room, under each other where there is not. */
export function FieldGrid({ children, column = 240 }: FieldGridProps) {
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: `repeat(auto-fill, minmax(min(${column}px, 100%), 1fr))`,
        gap: 5,
        alignItems: 'start',
        my: 4,
      }}
    >
      {children}
    </Box>
  )
}
