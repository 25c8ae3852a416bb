import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useId, type ReactNode } from 'react'

interface SectionProps {
  title: string
  aside?: ReactNode
  children: ReactNode
}

/** A part of a page under an ink line. No card around it, no shadow. */
export function Section({ title, aside, children }: SectionProps) {
  const id = useId()
  return (
    <Box component="section" aria-labelledby={id} sx={{ mt: 6 }}>
      <Box
        sx={{
          display: 'flex',
          flexWrap: 'wrap',
          alignItems: 'baseline',
          justifyContent: 'space-between',
          columnGap: 4,
          borderBottom: 1,
          borderColor: 'text.primary',
          pb: 1,
        }}
      >
        <Typography variant="h2" id={id}>
          {title}
        </Typography>
        {aside && (
          <Typography component="div" variant="body2" sx={{ color: 'text.secondary' }}>
            {aside}
          </Typography>
        )}
      </Box>
      {children}
    </Box>
  )
}
