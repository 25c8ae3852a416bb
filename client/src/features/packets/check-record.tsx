import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { PacketView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Instant } from '../../components/layout/instant'

interface CheckRecordProps {
  check: PacketView['technicalCheck']
}

/** Who checked a packet, when, and whether that person's limits cover it. */
export function CheckRecord({ check }: CheckRecordProps) {
  if (check === null) {
    return (
      <Box sx={{ py: 2 }}>
        <VerdictMark kind="waiting" words="not checked yet" />
      </Box>
    )
  }
  return (
    <Box sx={{ py: 2 }}>
      <VerdictMark
        kind={check.withinLimits ? 'pass' : 'fail'}
        words={check.withinLimits ? 'checked' : 'beyond limits'}
      />
      <Typography>
        {check.by}, <Instant at={check.at} />.{' '}
        {!check.withinLimits &&
          'The design is beyond the approval limits of this person. Somebody with wider limits must check it.'}
      </Typography>
      {check.note && <Typography sx={{ whiteSpace: 'pre-line' }}>“{check.note}”</Typography>}
    </Box>
  )
}
