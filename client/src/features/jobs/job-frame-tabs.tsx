import Box from '@mui/material/Box'
import { NavLink } from 'react-router-dom'
import type { JobView, Permission } from 'shared'
import { useMay } from '../../api/session-context'
import { useCurrentInView } from '../../components/layout/use-current-in-view'

interface JobTab {
  path: string
  words: (job: JobView) => string
  needs: Permission
}

const tabs: readonly JobTab[] = [
  { path: '', words: () => 'Overview', needs: 'job:read' },
  { path: 'survey', words: () => 'Survey', needs: 'design:read' },
  { path: 'design', words: () => 'Design', needs: 'design:read' },
  { path: 'figures', words: () => 'Figures', needs: 'design:read' },
  { path: 'checks', words: () => 'Checks', needs: 'design:read' },
  { path: 'cost-share', words: () => 'Cost and funding', needs: 'design:read' },
  { path: 'packet', words: () => 'Packet', needs: 'packet:read' },
  {
    path: 'notes',
    words: ({ openNotes }) => (openNotes > 0 ? `Notes, ${openNotes} open` : 'Notes'),
    needs: 'note:read',
  },
  { path: 'review', words: () => 'Review', needs: 'packet:check' },
  { path: 'send', words: () => 'Send', needs: 'mail:read' },
  { path: 'timeline', words: () => 'Timeline', needs: 'job:read' },
]

interface JobFrameTabsProps {
  job: JobView
}

/** The pages of one job as links. On a phone they scroll sideways, and the page one is on is brought into view. */
export function JobFrameTabs({ job }: JobFrameTabsProps) {
  const may = useMay()
  const bar = useCurrentInView()

  return (
    <Box
      component="nav"
      ref={bar}
      aria-label="Pages of this job"
      sx={{ display: 'flex', gap: 5, overflowX: 'auto', borderBottom: 1, borderColor: 'divider' }}
    >
      {tabs
        .filter(({ needs }) => may(needs))
        .map(({ path, words }) => (
          <Box
            key={path}
            component={NavLink}
            to={path === '' ? `/jobs/${job.id}` : `/jobs/${job.id}/${path}`}
            end={path === ''}
            sx={{
              color: 'text.primary',
              textDecoration: 'none',
              whiteSpace: 'nowrap',
              py: 2,
              borderBottom: 3,
              borderColor: 'transparent',
              '&.active': { borderColor: 'primary.main', fontWeight: 600 },
              '@media (pointer: coarse)': { py: 3 },
            }}
          >
            {words(job)}
          </Box>
        ))}
    </Box>
  )
}
