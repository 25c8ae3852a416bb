import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { designPlanSchema, type DesignPart, type DesignResult } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { Section } from '../../components/layout/section'
import { TextLink } from '../../components/layout/text-link'
import { partSpec } from './part-catalogue'
import { resultFigures } from './result-figures'
import { waitingWords, type ResultKey } from './result-words'

interface ResultPanelProps {
  resultKey: ResultKey
  result: DesignResult
  /** The part on the page, and where its neighbours are. */
  part: DesignPart
  designPath: string
  /** What nobody has begun is not wrong yet. */
  isBegun: boolean
}

const titles: Partial<Record<ResultKey, string>> = {
  profile: 'Profile of the ramp',
  quantities: 'Quantities',
  cost: 'Installed cost',
  funding: 'Funds',
}

/** What follows from one part: its figures, or the sentence that says what is in the way and where it is mended. */
export function ResultPanel({ resultKey, result, part, designPath, isBegun }: ResultPanelProps) {
  const found = result[resultKey]
  const title = titles[resultKey] ?? 'What follows'
  if (!found.ok && 'waitingFor' in found) {
    return (
      <Section title={title} aside={<VerdictMark kind="waiting" />}>
        <Typography sx={{ mt: 2 }}>It waits for {waitingWords(found.waitingFor)}.</Typography>
      </Section>
    )
  }
  if (!found.ok) {
    return (
      <Section
        title={title}
        aside={
          isBegun ? <VerdictMark kind="fail" words="needs another look" /> : <VerdictMark kind="waiting" />
        }
      >
        <Typography sx={{ mt: 2 }}>{found.message}</Typography>
        <WayToField field={found.field} part={part} designPath={designPath} />
      </Section>
    )
  }
  const figures = resultFigures(resultKey, found.value)
  return (
    <Section title={title} aside={<VerdictMark kind="pass" words="worked out" />}>
      {figures === null || figures.length === 0 ? (
        <Typography sx={{ mt: 2 }}>This design has none.</Typography>
      ) : (
        <FigureRows>
          {figures.map(({ label, value, unit, isSum }) => (
            <FigureRow key={label} label={label} value={value} unit={unit} isSum={isSum} />
          ))}
        </FigureRows>
      )}
    </Section>
  )
}

const isPart = (word: string): word is DesignPart => word in designPlanSchema.shape && word !== 'inputVersion'

function WayToField({
  field,
  part,
  designPath,
}: { field: string } & Pick<ResultPanelProps, 'part' | 'designPath'>) {
  const [root = ''] = field.split(/[.[]/)
  if (root === part) return null
  if (root === 'settings') {
    return (
      <Box sx={{ mt: 1 }}>
        <TextLink to="/settings">Open the settings</TextLink>
      </Box>
    )
  }
  if (!isPart(root)) return null
  return (
    <Box sx={{ mt: 1 }}>
      <TextLink to={`${designPath}/${root}`}>Open: {partSpec(root)?.title}</TextLink>
    </Box>
  )
}
