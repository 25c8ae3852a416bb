import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import type { ScheduleLine } from 'shared'
import { perUnit } from '../../components/layout/per-unit'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'
import { payWords } from './quantity-choices'

const columns: readonly Column[] = [
  { key: 'code', title: 'Code' },
  { key: 'title', title: 'Line' },
  { key: 'base', title: 'Rate', isFigure: true },
  { key: 'higher', title: 'Higher rate', isFigure: true },
  { key: 'quantity', title: 'Pays for' },
]

interface ScheduleLinesProps {
  lines: readonly ScheduleLine[]
}

/** The lines as they stand, for those who may not change them and for what is in force. */
export function ScheduleLines({ lines }: ScheduleLinesProps) {
  return (
    <Section title="Lines" aside={lines.length === 1 ? '1 line' : `${lines.length} lines`}>
      <RuledTable caption="Lines of the schedule" columns={columns} minWidth={720}>
        {lines.map((line) => (
          <TableRow key={line.code}>
            <TableCell component="th" scope="row">
              {line.code}
            </TableCell>
            <TableCell>
              {line.title}, practice {line.practice}
            </TableCell>
            <FigureCell unit={perUnit(line.unit)}>${line.baseRate}</FigureCell>
            <FigureCell>{line.higherRate ? `$${line.higherRate}` : '–'}</FigureCell>
            <TableCell>{payWords(line.quantityKey)}</TableCell>
          </TableRow>
        ))}
      </RuledTable>
    </Section>
  )
}
