import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'

interface TopBarProps {
  /** Navigation, under the name on a phone and beside it elsewhere. */
  navigation?: ReactNode
  children?: ReactNode
}

/** Name at the left, person at the right, an ink line under it. */
export function TopBar({ navigation, children }: TopBarProps) {
  return (
    <Box
      component="header"
      sx={{
        borderBottom: 1,
        borderColor: 'text.primary',
        px: { xs: 4, md: 6 },
        display: 'flex',
        flexWrap: 'wrap',
        alignItems: 'center',
        columnGap: 6,
        minHeight: 44,
      }}
    >
      <Box sx={{ display: 'flex', alignItems: 'center', gap: 2, py: 2 }}>
        <img src="/wadestone.svg" width="26" height="26" alt="" />
        <Typography component="span" variant="h2">
          Wadestone
        </Typography>
      </Box>
      {navigation && (
        <Box sx={{ order: { xs: 3, md: 0 }, width: { xs: '100%', md: 'auto' }, minWidth: 0 }}>
          {navigation}
        </Box>
      )}
      <Box sx={{ ml: 'auto', display: 'flex', alignItems: 'center', gap: 4 }}>{children}</Box>
    </Box>
  )
}
