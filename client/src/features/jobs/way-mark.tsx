import Box from '@mui/material/Box'
import type { JobState } from 'shared'

const way: readonly JobState[] = [
  'draft',
  'with-landowner',
  'with-supervisor',
  'approved',
  'sent',
  'building',
  'built',
  'certified',
  'paid',
  'in-service',
]
const STEP = 11

interface WayMarkProps {
  state: JobState
}

/** How far along its way a job is, as a little line with a mark; the state stands beside it in words. */
export function WayMark({ state }: WayMarkProps) {
  const place = way.indexOf(state === 'returned' ? 'draft' : state)
  if (place < 0) return null
  const x = 6 + place * STEP
  const end = 6 + (way.length - 1) * STEP
  const ticks = way.map((_, index) => `M${6 + index * STEP} 6v6`).join('')
  return (
    <Box
      component="svg"
      aria-hidden
      width={end + 6}
      height={18}
      sx={{ display: 'block', color: state === 'returned' ? 'warning.main' : 'primary.main' }}
    >
      <path d={`M6 9H${end}${ticks}`} stroke="var(--line)" fill="none" />
      <path d={`M6 9H${x}`} stroke="var(--ink)" strokeWidth="2" fill="none" />
      <path d={`M${x - 4} 2h8l-4 8z`} fill="currentColor" />
    </Box>
  )
}
