import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import { quantityCatalogue, quantityKeys, type CostListView } from 'shared'
import { perUnit } from '../../components/layout/per-unit'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'

const columns: readonly Column[] = [
  { key: 'quantity', title: 'Quantity' },
  { key: 'practice', title: 'Practice', isFigure: true },
  { key: 'low', title: 'Low', isFigure: true },
  { key: 'typical', title: 'Typical', isFigure: true },
  { key: 'high', title: 'High', isFigure: true },
]

interface CostListPricesProps {
  list: CostListView
}

/** The prices in the order of the bill of quantities. */
export function CostListPrices({ list }: CostListPricesProps) {
  return (
    <RuledTable caption={`Prices of ${list.name}`} columns={columns} minWidth={640}>
      {quantityKeys.flatMap((key) => {
        const line = list.lines.find((one) => one.key === key)
        const { description, practice, unit } = quantityCatalogue[key]
        if (line === undefined) return []
        const unitWords = perUnit(unit)
        return [
          <TableRow key={key}>
            <TableCell component="th" scope="row">
              {description}
            </TableCell>
            <FigureCell>{practice}</FigureCell>
            <FigureCell unit={unitWords}>${line.low}</FigureCell>
            <FigureCell unit={unitWords} isStrong>
              ${line.typical}
            </FigureCell>
            <FigureCell unit={unitWords}>${line.high}</FigureCell>
          </TableRow>,
        ]
      })}
    </RuledTable>
  )
}
