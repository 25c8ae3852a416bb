import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { CheckResult } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { countOf, countText, inOrder, verdictOrder } from './check-counts'
import { hasText, needsText } from './check-values'

interface ChecksSummaryProps {
  checks: readonly CheckResult[]
}

/** How many hold, and each one that does not. */
export function ChecksSummary({ checks }: ChecksSummaryProps) {
  const open = inOrder(checks).filter(({ verdict }) => verdict === 'fail' || verdict === 'caution')
  return (
    <Box>
      <Box sx={{ display: 'flex', flexWrap: 'wrap', columnGap: 5, py: 2 }}>
        {verdictOrder.map((verdict) => (
          <VerdictMark key={verdict} kind={verdict} words={countText(verdict, countOf(checks, verdict))} />
        ))}
      </Box>
      <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {open.map((check) => (
          <Box
            component="li"
            key={check.id}
            sx={{ display: 'flex', gap: 3, py: 1, borderTop: 1, borderColor: 'divider' }}
          >
            <VerdictMark kind={check.verdict} isShapeOnly />
            <Typography>
              {[`${check.title}: ${hasText(check)}`, needsText(check)].filter(Boolean).join(', ')}.
            </Typography>
          </Box>
        ))}
      </Box>
    </Box>
  )
}
