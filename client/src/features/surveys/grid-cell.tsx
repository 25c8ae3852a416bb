import InputBase from '@mui/material/InputBase'
import TableCell from '@mui/material/TableCell'
import { errorId } from '../../components/fields/field-frame'
import { fieldId } from '../../components/fields/field-id'
import { useFieldLabel } from '../../components/fields/form-labels'
import type { GridColumn } from './grid-columns'
import type { CellPlace } from './paste-block'
import type { GridActs } from './use-grid-acts'

interface GridCellProps {
  name: string
  column: GridColumn
  at: CellPlace
  value: string
  error: string | undefined
  acts: GridActs
  onBlur: () => void
}

/** One cell that is typed into, as wide as its column. */
export function GridCell({ name, column, at, value, error, acts, onBlur }: GridCellProps) {
  const id = fieldId(name)
  const label = `Row ${at.row + 1}, ${column.title.toLowerCase()}`
  useFieldLabel(name, label)
  return (
    <TableCell sx={{ p: '0 !important', width: column.width, borderRight: 1, borderRightColor: 'divider' }}>
      <InputBase
        id={id}
        name={name}
        value={value}
        onChange={(event) => acts.type(at, event.target.value)}
        onKeyDown={(event) => acts.press(at, event as React.KeyboardEvent<HTMLInputElement>)}
        onPaste={(event) => acts.paste(at, event as React.ClipboardEvent<HTMLInputElement>)}
        onBlur={onBlur}
        error={error !== undefined}
        autoComplete="off"
        slotProps={{
          input: {
            'aria-label': label,
            'aria-invalid': error !== undefined,
            'aria-describedby': error === undefined ? undefined : errorId(id),
            style: {
              textAlign: column.isText ? 'left' : 'right',
              fontVariantNumeric: 'tabular-nums lining-nums',
            },
          },
        }}
        sx={{ width: '100%', minWidth: column.width, borderColor: 'transparent', px: 2 }}
      />
    </TableCell>
  )
}
