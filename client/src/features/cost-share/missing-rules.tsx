import Box from '@mui/material/Box'
import { Section } from '../../components/layout/section'

interface MissingRulesProps {
  missing: readonly string[]
}

/** What the district still owes this design; each sentence says who can help. */
export function MissingRules({ missing }: MissingRulesProps) {
  if (missing.length === 0) return null
  return (
    <Section title="Ask the office">
      <Box component="ul" sx={{ m: 0, pl: 5, py: 2 }}>
        {missing.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </Box>
    </Section>
  )
}
