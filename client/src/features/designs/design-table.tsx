import Box from '@mui/material/Box'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { formatRatio, moneyText, numberText, type DesignView } from 'shared'
import { useChooseDesign } from '../../api/designs'
import { ActButton } from '../../components/feedback/act-button'
import { ProblemAlert } from '../../components/feedback/problem-alert'
import { VerdictMark } from '../../components/feedback/verdict-mark'
import { Instant } from '../../components/layout/instant'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'
import { DesignName } from './design-name'
import { partCatalogue } from './part-catalogue'

const firstPart = partCatalogue[0]?.part ?? ''

const columns: readonly Column[] = [
  { key: 'name', title: 'Design' },
  { key: 'chosen', title: 'Chosen' },
  { key: 'grade', title: 'Grade', isFigure: true },
  { key: 'stone', title: 'Stone, tons', isFigure: true },
  { key: 'cost', title: 'Installed cost', isFigure: true },
  { key: 'share', title: 'Landowner’s share', isFigure: true },
  { key: 'fails', title: 'Checks that fail', isFigure: true },
  { key: 'saved', title: 'Last saved' },
  { key: 'acts', title: '' },
]

interface DesignTableProps {
  jobId: string
  designs: readonly DesignView[]
  isLocked: boolean
}

/** The designs of one job beside each other, with what decides between them. */
export function DesignTable({ jobId, designs, isLocked }: DesignTableProps) {
  const choose = useChooseDesign(jobId)
  return (
    <>
      <ProblemAlert error={choose.error} />
      <RuledTable caption="Designs of this job" columns={columns} minWidth={960}>
        {designs.map((design) => (
          <DesignRow key={design.id} design={design} isLocked={isLocked} choose={choose} />
        ))}
      </RuledTable>
    </>
  )
}

interface DesignRowProps {
  design: DesignView
  isLocked: boolean
  choose: ReturnType<typeof useChooseDesign>
}

function DesignRow({ design, isLocked, choose }: DesignRowProps) {
  const { id, jobId, name, isChosen, plan, result, updatedAt, designerName } = design
  return (
    <TableRow>
      <TableCell component="th" scope="row" sx={{ minWidth: 160 }}>
        <DesignName
          design={design}
          path={`/jobs/${jobId}/design/${design.id}/${firstPart}`}
          isLocked={isLocked}
        />
      </TableCell>
      <TableCell>{isChosen && <VerdictMark kind="pass" words="chosen" />}</TableCell>
      <FigureCell>{plan.ramp ? formatRatio(plan.ramp.gradeRunPerRise) : '–'}</FigureCell>
      <FigureCell>{result.rock.ok ? numberText(result.rock.value.totalOrderTons, 1) : '–'}</FigureCell>
      <FigureCell>{result.cost.ok ? moneyText(result.cost.value.typical) : '–'}</FigureCell>
      <FigureCell>{result.funding.ok ? moneyText(result.funding.value.landownerShare) : '–'}</FigureCell>
      <FigureCell>{result.checks.filter(({ verdict }) => verdict === 'fail').length}</FigureCell>
      <TableCell>
        <Instant at={updatedAt} />
        <Box sx={{ color: 'text.secondary' }}>{designerName}</Box>
      </TableCell>
      <TableCell>
        {!isChosen && !isLocked && (
          <ActButton
            words={`Choose ${name}`}
            onAct={() => choose.mutate(id)}
            isBusy={choose.isPending && choose.variables === id}
            busyWords="Choosing…"
          />
        )}
      </TableCell>
    </TableRow>
  )
}
