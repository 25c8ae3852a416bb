import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { formatQuantity, type QuantityLine } from 'shared'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'

const columns: readonly Column[] = [
  { key: 'item', title: 'Item' },
  { key: 'quantity', title: 'Quantity', isFigure: true },
  { key: 'placed', title: 'In place', isFigure: true },
  { key: 'practice', title: 'Practice', isFigure: true },
  { key: 'from', title: 'Where it comes from' },
]

interface QuantitiesTableProps {
  lines: readonly QuantityLine[]
}

/** The bill of quantities that cost, funding and packet share. */
export function QuantitiesTable({ lines }: QuantitiesTableProps) {
  return (
    <RuledTable caption="Bill of quantities" columns={columns} minWidth={720}>
      {lines.map((line) => (
        <TableRow key={line.key}>
          <TableCell component="th" scope="row" sx={{ minWidth: 144 }}>
            {line.description}
          </TableCell>
          <FigureCell isStrong>{formatQuantity(line.quantity, line.unit)}</FigureCell>
          <FigureCell>{formatQuantity(line.inPlaceQuantity, line.unit)}</FigureCell>
          <FigureCell>{line.practice}</FigureCell>
          <TableCell sx={{ color: 'text.secondary' }}>{line.fromFigure}</TableCell>
        </TableRow>
      ))}
    </RuledTable>
  )
}
