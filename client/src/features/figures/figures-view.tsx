import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { designParts, type DesignView } from 'shared'
import { Section } from '../../components/layout/section'
import { NotReadyNote } from './not-ready-note'
import { OpenParts } from './open-parts'
import { PartFigures } from './part-figures'
import { QuantitiesTable } from './quantities-table'

interface FiguresViewProps {
  design: DesignView
}

export function FiguresView({ design }: FiguresViewProps) {
  const { result } = design
  return (
    <>
      <Typography sx={{ color: 'text.secondary' }}>
        Design “{design.name}”. Each figure with its formula and the numbers put in, to four places. Nothing
        but money and the bill of quantities is rounded on the way.
      </Typography>
      <OpenParts design={design} />
      <Section title="Bill of quantities" aside="Stone and fabric as ordered, with waste and laps">
        {result.quantities.ok ? (
          <QuantitiesTable lines={result.quantities.value} />
        ) : (
          <Box sx={{ py: 2 }}>
            <NotReadyNote design={design} result={result.quantities} />
          </Box>
        )}
      </Section>
      {designParts
        .filter((part) => result[part].ok)
        .map((part) => (
          <PartFigures key={part} design={design} part={part} />
        ))}
    </>
  )
}
