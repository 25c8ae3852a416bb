import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { Checker } from './checkers'
import { limitsText } from './limits-text'

interface WhoMayCheckProps {
  checkers: readonly Checker[]
}

/** Everyone whose role checks, how far each may go, and who made the design and therefore may not. */
export function WhoMayCheck({ checkers }: WhoMayCheckProps) {
  return (
    <Box sx={{ py: 2 }}>
      <Typography sx={{ fontWeight: 600 }}>Who may check it</Typography>
      {checkers.length === 0 && <Typography>Nobody yet. An administrator gives the role.</Typography>}
      <Box component="ul" sx={{ m: 0, pl: 5 }}>
        {checkers.map(({ id, name, limits, isDesigner }) => (
          <li key={id}>
            {name},{' '}
            <Box component="span" sx={{ color: 'text.secondary' }}>
              {isDesigner ? 'who made the design and so may not' : limitsText(limits)}
            </Box>
          </li>
        ))}
      </Box>
    </Box>
  )
}
