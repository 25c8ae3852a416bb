import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { CheckResult } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { inOrder } from './check-counts'
import { hasText, needsText } from './check-values'

interface CheckListProps {
  checks: readonly CheckResult[]
}

const columns = {
  xs: '1fr',
  sm: '128px minmax(0, 1fr)',
  md: '128px minmax(0, 3fr) minmax(0, 2fr) minmax(0, 3fr)',
}

/** One line a check: verdict, what it is about, has and needs, source. What fails stands first. */
export function CheckList({ checks }: CheckListProps) {
  return (
    <Box component="ol" sx={{ listStyle: 'none', m: 0, p: 0, borderTop: 1, borderColor: 'text.primary' }}>
      {inOrder(checks).map((check) => (
        <CheckLine key={check.id} check={check} />
      ))}
    </Box>
  )
}

function CheckLine({ check }: { check: CheckResult }) {
  const needs = needsText(check)
  const muted = { color: 'text.secondary' }
  const below = { gridColumn: { sm: 2, md: 'auto' } }
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: columns,
        alignItems: 'start',
        columnGap: 4,
        rowGap: 1,
        py: 2,
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <VerdictMark kind={check.verdict} />
      <Box>
        <Typography sx={{ fontWeight: 600 }}>{check.title}</Typography>
        {check.note && <Typography variant="body2">{check.note}</Typography>}
      </Box>
      <Typography className="figure" sx={below}>
        <strong>{hasText(check)}</strong>
        {needs && `, ${needs}`}
      </Typography>
      <Typography variant="body2" sx={{ ...muted, ...below }}>
        Source: {check.source} (practice {check.practice})
      </Typography>
    </Box>
  )
}
