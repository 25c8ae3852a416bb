import Typography from '@mui/material/Typography'
import { partWords, type DesignPartName, type DesignView } from 'shared'
import { FigureRow, FigureRows } from '../../components/layout/figure-rows'
import { Section } from '../../components/layout/section'
import { TextLink } from '../../components/layout/text-link'
import { partPlace } from './design-place'
import { panelFigures } from './panel-figures'
import { WorkingRow } from './working-row'

interface PartFiguresProps {
  design: DesignView
  part: DesignPartName
}

/** All figures of one part that is worked out. */
export function PartFigures({ design, part }: PartFiguresProps) {
  const { result } = design
  const working = result.working.filter((figure) => figure.part === part)
  const plain = part === 'closingPanel' ? panelFigures(result) : []
  return (
    <Section
      title={partWords[part]}
      aside={
        <TextLink to={partPlace(design, part)}>
          Open in the design<span className="visually-hidden">: {partWords[part]}</span>
        </TextLink>
      }
    >
      {working.length + plain.length === 0 ? (
        <Typography sx={{ color: 'text.secondary', py: 2 }}>This job has none.</Typography>
      ) : (
        <FigureRows>
          {working.map((figure) => (
            <WorkingRow key={figure.key} figure={figure} />
          ))}
          {plain.map(({ label, value, unit }) => (
            <FigureRow key={label} label={label} value={<strong>{value}</strong>} unit={unit} />
          ))}
        </FigureRows>
      )}
    </Section>
  )
}
