import Box from '@mui/material/Box'
import type { ReactNode } from 'react'
import { Page } from '../../components/layout/page'

interface LandownerPageProps {
  title: string
  children: ReactNode
}

/** Read on a telephone with wet hands: everything to press is 44 px high whatever the pointer is. */
const touchSx = {
  '& .MuiButton-root': { minHeight: 44 },
  '& .MuiCheckbox-root': { padding: '10px' },
  '& .MuiInputBase-root': { minHeight: 46 },
  // What has the focus must not hide behind the bar at the foot of the page.
  '& :focus': { scrollMarginBottom: 180 },
} as const

export function LandownerPage({ title, children }: LandownerPageProps) {
  return (
    <Box sx={touchSx}>
      <Page title={title} maxWidth={680}>
        {children}
      </Page>
    </Box>
  )
}
