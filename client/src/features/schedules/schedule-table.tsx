import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { formatCivilDate, type ScheduleListItem } from 'shared'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { TextLink } from '../../components/layout/text-link'
import { kindWords } from './schedule-words'

const columns: readonly Column[] = [
  { key: 'name', title: 'Schedule' },
  { key: 'year', title: 'Fiscal year', isFigure: true },
  { key: 'state', title: 'State' },
  { key: 'kind', title: 'Pays' },
  { key: 'dates', title: 'From, to' },
  { key: 'lines', title: 'Lines', isFigure: true },
  { key: 'unmapped', title: 'Not mapped' },
]

interface ScheduleTableProps {
  schedules: readonly ScheduleListItem[]
}

export function ScheduleTable({ schedules }: ScheduleTableProps) {
  return (
    <RuledTable caption="Payment schedules" columns={columns} minWidth={860}>
      {schedules.map((schedule) => (
        <TableRow key={schedule.id}>
          <TableCell component="th" scope="row">
            <TextLink to={`/schedules/${schedule.id}`} isStrong>
              {schedule.name}
            </TextLink>
          </TableCell>
          <FigureCell>{schedule.fiscalYear}</FigureCell>
          <TableCell>{schedule.status.replace('-', ' ')}</TableCell>
          <TableCell>{kindWords[schedule.kind]}</TableCell>
          <TableCell sx={{ whiteSpace: 'nowrap' }}>
            {formatCivilDate(schedule.effectiveFrom)}, {formatCivilDate(schedule.effectiveTo)}
          </TableCell>
          <FigureCell>{schedule.lines}</FigureCell>
          <TableCell>
            {schedule.unmappedLines === 0 ? (
              'none'
            ) : (
              <VerdictMark kind="caution" words={`${schedule.unmappedLines}`} />
            )}
          </TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
