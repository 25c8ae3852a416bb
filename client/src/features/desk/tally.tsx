import Box from '@mui/material/Box'

interface TallyProps {
  days: number
}

const MOST = 15
const STROKE = 6
const GROUP = 5 * STROKE + 4

const strokesOf = (count: number): string =>
  Array.from({ length: count }, (_, index) => {
    const group = Math.floor(index / 5)
    const place = index % 5
    const x = group * GROUP + place * STROKE + 2
    return place === 4 ? `M${group * GROUP - 1} 13L${x} 5` : `M${x} 3v12`
  }).join('')

/** Days of waiting as tally marks, as one keeps count in a field book. The number stands beside them. */
export function Tally({ days }: TallyProps) {
  const shown = Math.min(days, MOST)
  return (
    <Box component="svg" aria-hidden width={GROUP * 3} height={18} sx={{ flex: 'none', display: 'block' }}>
      <path d={strokesOf(shown)} fill="none" stroke="currentColor" strokeWidth="1.5" />
    </Box>
  )
}
