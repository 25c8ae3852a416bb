import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import type { ScheduleLine } from 'shared'
import { SelectField } from '../../components/fields/select-field'
import { perUnit } from '../../components/layout/per-unit'
import { FigureCell } from '../../components/layout/ruled-table'
import { quantityChoices } from './quantity-choices'

interface MappingRowProps {
  line: Omit<ScheduleLine, 'quantityKey'>
  /** Its place in the form. */
  index: number
}

export function MappingRow({ line, index }: MappingRowProps) {
  return (
    <TableRow>
      <TableCell component="th" scope="row" sx={{ whiteSpace: 'nowrap' }}>
        {line.code}
      </TableCell>
      <TableCell>
        {line.title}, practice {line.practice}
      </TableCell>
      <FigureCell unit={perUnit(line.unit)}>${line.baseRate}</FigureCell>
      <TableCell>
        <SelectField
          name={`mapping.${index}.quantityKey`}
          label={`${line.code} pays for`}
          choices={quantityChoices}
          emptyLabel="nothing of ours"
          isLabelHidden
        />
      </TableCell>
    </TableRow>
  )
}
