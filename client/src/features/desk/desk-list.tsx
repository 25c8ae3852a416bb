import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { useState } from 'react'
import type { DeskItem } from 'shared'
import { LinkButton } from '../../components/layout/link-button'
import { daysWaiting } from './days-waiting'
import { Tally } from './tally'

interface DeskListProps {
  items: readonly DeskItem[]
}

const columns = {
  xs: '1fr',
  sm: '64px 1fr auto',
  md: '64px 112px 240px 1fr auto',
}

/** One line a job: how long it waits, which it is, why, and the one act. The oldest act is the filled one. */
export function DeskList({ items }: DeskListProps) {
  const [nowMs] = useState(() => Date.now())
  return (
    <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0, borderTop: 1, borderColor: 'text.primary' }}>
      {items.map((item, index) => {
        const days = daysWaiting(item.waitingSince, nowMs)
        return (
          <Box
            component="li"
            key={`${item.jobId} ${item.nextAct}`}
            sx={{
              display: 'grid',
              gridTemplateColumns: columns,
              columnGap: 4,
              rowGap: 1,
              alignItems: 'center',
              borderBottom: 1,
              borderColor: 'divider',
              py: 2,
            }}
          >
            <Typography className="figure" sx={{ color: 'text.secondary', textAlign: { sm: 'right' } }}>
              {days === 0 ? 'today' : days === 1 ? '1 day' : `${days} days`}
            </Typography>
            <Box sx={{ display: { xs: 'none', md: 'block' } }}>
              <Tally days={days} />
            </Box>
            <Typography sx={{ fontWeight: 600, gridColumn: { sm: 2, md: 'auto' } }}>
              {item.title}
              <Typography component="span" sx={{ color: 'text.secondary', pl: 2, whiteSpace: 'nowrap' }}>
                {item.number}
              </Typography>
            </Typography>
            <Typography sx={{ gridColumn: { sm: 2, md: 'auto' } }}>{item.sentence}</Typography>
            <Box sx={{ gridColumn: { sm: 3, md: 'auto' }, gridRow: { sm: '1 / span 2', md: 'auto' } }}>
              <LinkButton to={item.path} words={item.nextAct} isMain={index === 0} />
            </Box>
          </Box>
        )
      })}
    </Box>
  )
}
