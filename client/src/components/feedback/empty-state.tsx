import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'

interface EmptyStateProps {
  title: string
  children: ReactNode
  action?: ReactNode
}

/** Nothing here yet, and what to do about it. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <Box sx={{ py: 8, maxWidth: 560 }}>
      <Typography variant="h3" component="p">
        {title}
      </Typography>
      <Typography sx={{ color: 'text.secondary', mt: 1, mb: 4 }} component="div">
        {children}
      </Typography>
      {action}
    </Box>
  )
}
