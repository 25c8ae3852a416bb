import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface FieldGridProps {
  children: ReactNode
  /** Least width of a column in px. */
  column?: number
}

/** A field takes three rows of the grid, so that boxes stand in line where one label has a hint and the next has none. */
const inLine = {
  '& > *': { gridRow: 'span 3', mb: 5 },
  '& > .field-frame': { display: 'grid', gridTemplateRows: 'subgrid', alignItems: 'start' },
} as const

/** Fields side by side where there is room, under each other where there is not. */
export function FieldGrid({ children, column = 240 }: FieldGridProps) {
  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: `repeat(auto-fill, minmax(min(${column}px, 100%), 1fr))`,
        columnGap: 5,
        alignItems: 'start',
        mt: 4,
        ...inLine,
      }}
    >
      {children}
    </Box>
  )
}
