import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import { formatStation, numberText, type GroundPoint } from 'shared'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'

const columns: readonly Column[] = [
  { key: 'station', title: 'Station', isFigure: true },
  { key: 'elevation', title: 'Elevation', isFigure: true },
]

interface GroundLineTableProps {
  groundLine: readonly GroundPoint[]
}

/** The line on which the ramp is designed: every point that has a station, in order. */
export function GroundLineTable({ groundLine }: GroundLineTableProps) {
  return (
    <Section title="Ground line" aside={groundLine.length > 0 ? `${groundLine.length} points` : undefined}>
      {groundLine.length === 0 ? (
        <Typography sx={{ color: 'text.secondary', mt: 2 }}>
          It appears when two points have a station and an elevation.
        </Typography>
      ) : (
        <RuledTable caption="Ground line" columns={columns}>
          {groundLine.map(({ stationFt, elevationFt }) => (
            <TableRow key={stationFt}>
              <FigureCell>
                {formatStation({ stationFt, decimals: Number.isInteger(stationFt) ? 0 : 2 })}
              </FigureCell>
              <FigureCell unit="ft" isStrong>
                {numberText(elevationFt, 2)}
              </FigureCell>
            </TableRow>
          ))}
        </RuledTable>
      )}
    </Section>
  )
}
