import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { useQuery } from '@tanstack/react-query'
import type { JobView } from 'shared'
import { designsQuery } from '../../api/designs'
import { packetQuery } from '../../api/packets'
import { useMay } from '../../api/session-context'
import { VerdictMark, type MarkKind } from '../../components/feedback/verdict-mark'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { TextLink } from '../../components/layout/text-link'
import { jobOverviewSteps } from './job-overview-steps'

const columns: readonly Column[] = [
  { key: 'step', title: 'Step' },
  { key: 'mark', title: 'State' },
  { key: 'sentence', title: 'In words' },
]

const markWords: Partial<Record<MarkKind, string>> = {
  pass: 'done',
  waiting: 'to do',
  fail: 'needs another look',
}

interface JobOverviewWayProps {
  job: JobView
}

/** What is done of the way, each step with its page. */
export function JobOverviewWay({ job }: JobOverviewWayProps) {
  const may = useMay()
  const designs = useQuery({ ...designsQuery(job.id), enabled: may('design:read') })
  const packet = useQuery({
    ...packetQuery(job.packetId ?? ''),
    enabled: job.packetId !== null && may('packet:read'),
  })
  const design = designs.data?.find(({ id }) => id === job.chosenDesignId) ?? null
  const steps = jobOverviewSteps({
    job,
    design,
    packet: job.packetId === null ? null : (packet.data ?? null),
  })
  return (
    <RuledTable caption="What is done of the way" columns={columns}>
      {steps.map(({ title, path, mark, sentence }) => (
        <TableRow key={title}>
          <TableCell component="th" scope="row">
            <TextLink to={`/jobs/${job.id}/${path}`}>{title}</TextLink>
          </TableCell>
          <TableCell>
            <VerdictMark kind={mark} words={markWords[mark]} />
          </TableCell>
          <TableCell>{sentence}</TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
