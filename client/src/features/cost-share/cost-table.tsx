import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { formatQuantity, moneyText, type CostEstimate } from 'shared'
import { FigureCell, RuledTable, SumRow, type Column } from '../../components/layout/ruled-table'

const columns: readonly Column[] = [
  { key: 'item', title: 'Item' },
  { key: 'quantity', title: 'Quantity', isFigure: true },
  { key: 'rate', title: 'Typical cost a unit', isFigure: true },
  { key: 'low', title: 'Low', isFigure: true },
  { key: 'typical', title: 'Typical', isFigure: true },
  { key: 'high', title: 'High', isFigure: true },
]

interface CostTableProps {
  cost: CostEstimate
}

/** Each line at the three unit costs of the list. Funding is held against the typical one. */
export function CostTable({ cost }: CostTableProps) {
  return (
    <RuledTable caption="Estimated cost" columns={columns} minWidth={720}>
      {cost.lines.map((line) => (
        <TableRow key={line.key}>
          <TableCell component="th" scope="row" sx={{ minWidth: 144 }}>
            {line.description}
          </TableCell>
          <FigureCell>{formatQuantity(line.quantity, line.unit)}</FigureCell>
          <FigureCell>{moneyText(line.unitCost.typical)}</FigureCell>
          <FigureCell>{moneyText(line.low)}</FigureCell>
          <FigureCell isStrong>{moneyText(line.typical)}</FigureCell>
          <FigureCell>{moneyText(line.high)}</FigureCell>
        </TableRow>
      ))}
      <SumRow>
        <TableCell component="th" scope="row" colSpan={3}>
          Total
        </TableCell>
        <FigureCell>{moneyText(cost.low)}</FigureCell>
        <FigureCell isStrong>{moneyText(cost.typical)}</FigureCell>
        <FigureCell>{moneyText(cost.high)}</FigureCell>
      </SumRow>
    </RuledTable>
  )
}
