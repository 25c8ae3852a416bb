import Box from '@mui/material/Box'
import type { Permission } from 'shared'
import { NavLink } from 'react-router-dom'
import { useMay } from '../api/session-context'
import { useCurrentInView } from '../components/layout/use-current-in-view'

interface Place {
  to: string
  words: string
  needs?: Permission
}

const places: readonly Place[] = [
  { to: '/desk', words: 'Desk' },
  { to: '/jobs', words: 'Jobs', needs: 'job:list' },
  { to: '/producers', words: 'Producers', needs: 'producer:read' },
  { to: '/schedules', words: 'Schedules', needs: 'schedule:read' },
  { to: '/cost-lists', words: 'Prices', needs: 'settings:read' },
  { to: '/settings', words: 'Settings', needs: 'settings:read' },
  { to: '/people', words: 'People', needs: 'people:read' },
]

/** On a phone the places scroll sideways, and the one that one is at is brought into view. */
export function StaffNavigation() {
  const may = useMay()
  const bar = useCurrentInView()

  return (
    <Box
      component="nav"
      ref={bar}
      aria-label="Wadestone"
      sx={{ display: 'flex', gap: { xs: 5, md: 6 }, overflowX: 'auto' }}
    >
      {places
        .filter(({ needs }) => needs === undefined || may(needs))
        .map(({ to, words }) => (
          <Box
            key={to}
            component={NavLink}
            to={to}
            sx={{
              color: 'text.primary',
              textDecoration: 'none',
              py: '10px',
              borderBottom: 3,
              borderColor: 'transparent',
              '&.active': { borderColor: 'text.primary', fontWeight: 600 },
            }}
          >
            {words}
          </Box>
        ))}
    </Box>
  )
}
