import Box from '@mui/material/Box'
import { partWords, designParts, type DesignView } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Section } from '../../components/layout/section'
import { TextLink } from '../../components/layout/text-link'
import { partPlace } from './design-place'
import { NotReadyNote } from './not-ready-note'

interface OpenPartsProps {
  design: DesignView
}

/** The parts that cannot be worked out yet, on top, since all that is wrong or missing in a job starts there. */
export function OpenParts({ design }: OpenPartsProps) {
  const open = designParts.filter((part) => !design.result[part].ok)
  if (open.length === 0) return null
  return (
    <Section title="Not worked out yet" aside={`${open.length} of ${designParts.length} parts`}>
      <Box component="ul" sx={{ listStyle: 'none', m: 0, p: 0 }}>
        {open.map((part) => (
          <OpenPart key={part} design={design} part={part} />
        ))}
      </Box>
    </Section>
  )
}

function OpenPart({ design, part }: OpenPartsProps & { part: (typeof designParts)[number] }) {
  const result = design.result[part]
  if (result.ok) return null
  const isFailed = 'message' in result
  return (
    <Box
      component="li"
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', sm: '104px 144px minmax(0, 1fr)' },
        alignItems: 'start',
        columnGap: 4,
        rowGap: 1,
        py: 2,
        borderBottom: 1,
        borderColor: 'divider',
      }}
    >
      <VerdictMark kind={isFailed ? 'fail' : 'waiting'} words={isFailed ? 'missing' : undefined} />
      <TextLink to={partPlace(design, part)} isStrong>
        {partWords[part]}
      </TextLink>
      <NotReadyNote design={design} result={result} />
    </Box>
  )
}
