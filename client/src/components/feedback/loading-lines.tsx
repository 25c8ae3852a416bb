import Box from '@mui/material/Box'

interface LoadingLinesProps {
  count?: number
  words?: string
}

/** Ruled lines where the answer will stand, so that nothing jumps when it comes. */
export function LoadingLines({ count = 5, words = 'Loading' }: LoadingLinesProps) {
  return (
    <Box role="status" sx={{ my: 4 }}>
      <span className="visually-hidden">{words}</span>
      {Array.from({ length: count }, (_, index) => (
        <Box key={index} sx={{ height: 40, borderBottom: 1, borderColor: 'divider', pt: '14px' }}>
          <Box sx={{ height: 10, width: `${62 - ((index * 17) % 40)}%`, bgcolor: 'divider', opacity: 0.6 }} />
        </Box>
      ))}
    </Box>
  )
}
