import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import { usePageTitle } from './use-page-title'

interface PageProps {
  title: string
  /** Beside the title, in lighter ink. */
  beside?: ReactNode
  /** Right of the title: links or one button. */
  action?: ReactNode
  children: ReactNode
  /** Text pages read better when they are not as wide as the screen. */
  maxWidth?: number
}

/** One page: its title in the tab and on the page, and the focus on it when one comes from another page. */
export function Page({ title, beside, action, children, maxWidth }: PageProps) {
  const heading = usePageTitle(title)
  return (
    <Box sx={{ px: { xs: 4, md: 6 }, py: 4, maxWidth }}>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'baseline', columnGap: 4, rowGap: 2, mb: 2 }}>
        <Typography variant="h1" tabIndex={-1} ref={heading}>
          {title}
        </Typography>
        {beside && <Typography sx={{ color: 'text.secondary' }}>{beside}</Typography>}
        {action && <Box sx={{ ml: 'auto' }}>{action}</Box>}
      </Box>
      {children}
    </Box>
  )
}
