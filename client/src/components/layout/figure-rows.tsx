import Box from '@mui/material/Box'
import type { ReactNode } from 'react'

interface FigureRowsProps {
  children: ReactNode
}

/** A column of figures, ruled, numbers at the right. */
export function FigureRows({ children }: FigureRowsProps) {
  return (
    <Box component="dl" sx={{ m: 0 }}>
      {children}
    </Box>
  )
}

interface FigureRowProps {
  label: ReactNode
  value: ReactNode
  unit?: string
  /** Under a double rule: the sum of what stands above. */
  isSum?: boolean
}

export function FigureRow({ label, value, unit, isSum = false }: FigureRowProps) {
  return (
    <Box
      sx={{
        display: 'flex',
        justifyContent: 'space-between',
        gap: 4,
        py: '6px',
        borderBottom: isSum ? 0 : 1,
        borderTop: isSum ? '3px double' : 0,
        borderColor: isSum ? 'text.primary' : 'divider',
        fontWeight: isSum ? 600 : 400,
      }}
    >
      <Box component="dt">{label}</Box>
      <Box component="dd" className="figure" sx={{ m: 0, textAlign: 'right' }}>
        {value}
        {unit && (
          <Box component="span" sx={{ color: 'text.secondary', fontWeight: 400 }}>
            {'\u00a0'}
            {unit}
          </Box>
        )}
      </Box>
    </Box>
  )
}
