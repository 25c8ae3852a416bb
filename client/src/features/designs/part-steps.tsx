import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import type { DesignPart } from 'shared'
import { LinkButton } from '../../components/layout/link-button'
import { partCatalogue } from './part-catalogue'

interface PartStepsProps {
  part: DesignPart
  designPath: string
}

/** To the neighbours of a part. */
export function PartSteps({ part, designPath }: PartStepsProps) {
  const place = partCatalogue.findIndex((spec) => spec.part === part)
  const before = partCatalogue[place - 1]
  const after = partCatalogue[place + 1]
  return (
    <Box sx={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: 4, mt: 6 }}>
      {before && <LinkButton to={`${designPath}/${before.part}`} words={`Back: ${before.title}`} />}
      {after && <LinkButton to={`${designPath}/${after.part}`} words={`Next: ${after.title}`} />}
      <Typography sx={{ color: 'text.secondary' }}>
        Part {place + 1} of {partCatalogue.length}
      </Typography>
    </Box>
  )
}
