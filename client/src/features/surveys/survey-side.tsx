import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { GroundLineTable } from './ground-line-table'
import type { SurveySoFar } from './reduce-so-far'
import { ReductionPanel } from './reduction-panel'

interface SurveySideProps {
  soFar: SurveySoFar
}

/** What follows from the notes as they stand. */
export function SurveySide({ soFar }: SurveySideProps) {
  const { reduction, groundLine, sentence } = soFar
  return (
    <Box component="aside" aria-label="What follows" sx={{ minWidth: 0 }}>
      <Box aria-live="polite">
        {sentence !== null && (
          <Typography sx={{ borderLeft: 4, borderColor: 'warning.main', pl: 4, mt: 6 }}>
            {sentence}
          </Typography>
        )}
      </Box>
      {reduction && <ReductionPanel reduction={reduction} />}
      <GroundLineTable groundLine={groundLine} />
    </Box>
  )
}
