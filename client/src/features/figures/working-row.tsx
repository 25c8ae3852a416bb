import Box from '@mui/material/Box'
import Typography from '@mui/material/Typography'
import { noBreakSpace, trimmedNumber, type WorkingFigure } from 'shared'
import { FigureRow } from '../../components/layout/figure-rows'

/** To so many places the packet prints its working; screen and paper show the same. */
const PLACES = 4

const putIn = ({ name, value, unit }: WorkingFigure['numbers'][number]): string =>
  `${name} = ${trimmedNumber(value, PLACES)}${unit ? noBreakSpace : ''}${unit}`

interface WorkingRowProps {
  figure: WorkingFigure
}

/** One figure with its formula, the numbers put in and where the formula comes from. */
export function WorkingRow({ figure }: WorkingRowProps) {
  const muted = { color: 'text.secondary' }
  return (
    <FigureRow
      label={
        <>
          <Box component="span" sx={{ fontWeight: 600 }}>
            {figure.label}
          </Box>
          <Typography variant="body2">{figure.formula}</Typography>
          {figure.numbers.length > 0 && (
            <Typography variant="body2" className="figure" sx={muted}>
              {figure.numbers.map(putIn).join('; ')}
            </Typography>
          )}
          <Typography variant="body2" sx={muted}>
            Source: {figure.source}
          </Typography>
        </>
      }
      value={<strong>{trimmedNumber(figure.result, PLACES)}</strong>}
      unit={figure.unit}
    />
  )
}
