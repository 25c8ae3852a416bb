import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { formatRatio, moneyText, numberText, stateWords, type JobListItem } from 'shared'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { TextLink } from '../../components/layout/text-link'
import { WayMark } from './way-mark'

const columns: readonly Column[] = [
  { key: 'job', title: 'Job' },
  { key: 'number', title: 'Number' },
  { key: 'producer', title: 'Producer' },
  { key: 'water', title: 'Water' },
  { key: 'way', title: 'Along the way' },
  { key: 'state', title: 'State' },
  { key: 'waits', title: 'Waits for' },
  { key: 'grade', title: 'Grade', isFigure: true },
  { key: 'stone', title: 'Stone, tons', isFigure: true },
  { key: 'share', title: 'Landowner’s share', isFigure: true },
]

interface JobTableProps {
  jobs: readonly JobListItem[]
}

export function JobTable({ jobs }: JobTableProps) {
  return (
    <RuledTable caption="Jobs, newest change first" columns={columns} minWidth={1060}>
      {jobs.map((job) => (
        <TableRow key={job.id}>
          <TableCell component="th" scope="row" sx={{ minWidth: 160 }}>
            <TextLink to={`/jobs/${job.id}`} isStrong>
              {job.title}
            </TextLink>
          </TableCell>
          <TableCell sx={{ color: 'text.secondary', whiteSpace: 'nowrap' }}>{job.number}</TableCell>
          <TableCell>{job.producerNames.join(', ')}</TableCell>
          <TableCell sx={{ color: 'text.secondary' }}>{job.body}</TableCell>
          <TableCell>
            <WayMark state={job.state} />
          </TableCell>
          <TableCell sx={{ whiteSpace: 'nowrap' }}>{stateWords[job.state]}</TableCell>
          <TableCell>{job.waitsFor}</TableCell>
          <FigureCell>{job.gradeRunPerRise === null ? '–' : formatRatio(job.gradeRunPerRise)}</FigureCell>
          <FigureCell>{job.stoneOrderTons === null ? '–' : numberText(job.stoneOrderTons, 1)}</FigureCell>
          <FigureCell>{job.landownerShare === null ? '–' : moneyText(job.landownerShare)}</FigureCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
