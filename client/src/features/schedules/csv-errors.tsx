import Box from '@mui/material/Box'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import type { CsvRowError } from '../../api/surveys'
import { FigureCell, RuledTable, type Column } from '../../components/layout/ruled-table'

const columns: readonly Column[] = [
  { key: 'row', title: 'Row', isFigure: true, width: 64 },
  { key: 'column', title: 'Column' },
  { key: 'message', title: 'What would be right' },
]

interface CsvErrorsProps {
  errors: readonly CsvRowError[]
}

/** What could not be read, by row and column of the file. */
export function CsvErrors({ errors }: CsvErrorsProps) {
  if (errors.length === 0) return null
  return (
    <Box role="alert" sx={{ borderLeft: 4, borderColor: 'error.main', pl: 4, my: 3 }}>
      <Typography sx={{ fontWeight: 600, color: 'error.main' }}>
        {errors.length === 1
          ? 'One place of the file could not be read'
          : `${errors.length} places of the file could not be read`}
      </Typography>
      <RuledTable caption="Places that could not be read" columns={columns}>
        {errors.map(({ row, column, message }) => (
          <TableRow key={`${row} ${column} ${message}`}>
            <FigureCell>{row}</FigureCell>
            <TableCell>{column ?? 'whole row'}</TableCell>
            <TableCell>{message}</TableCell>
          </TableRow>
        ))}
      </RuledTable>
    </Box>
  )
}
