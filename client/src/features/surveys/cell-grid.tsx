import Box from '@mui/material/Box'
import Button from '@mui/material/Button'
import Typography from '@mui/material/Typography'
import type { ReactNode } from 'react'
import { get, useFormState } from 'react-hook-form'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import type { GridColumn } from './grid-columns'
import { GridLine, type DerivedColumn } from './grid-line'
import { errorsOfRow, rowMessages } from './row-messages'
import type { useGridActs } from './use-grid-acts'

interface CellGridProps {
  name: string
  caption: string
  columns: readonly GridColumn[]
  derivedColumns?: readonly DerivedColumn[]
  /** Figures of the derived columns for a row. */
  derive?: (index: number) => readonly string[]
  grid: ReturnType<typeof useGridActs>
  /** Rows under the typed ones, such as sums. */
  foot?: ReactNode
}

const none: readonly DerivedColumn[] = []
const nothing = (): readonly string[] => []

const headOf = (columns: readonly GridColumn[], derivedColumns: readonly DerivedColumn[]): Column[] => [
  { key: 'row', title: 'Row', isFigure: true },
  ...columns.flatMap(({ key, title, isText }): Column[] => [
    { key, title, isFigure: !isText },
    ...derivedColumns
      .filter(({ after }) => after === key)
      .map((derived) => ({ key: derived.title, title: derived.title, isFigure: true })),
  ]),
  { key: 'acts', title: '' },
]

/** Rows that are typed as in a spreadsheet: arrows and Enter move, a block can be pasted, each change can be undone. */
export function CellGrid(props: CellGridProps) {
  const { name, caption, columns, derivedColumns = none, derive = nothing, grid, foot } = props
  const { errors } = useFormState({ name })
  const found: unknown = get(errors, name)
  const { rowMessage } = rowMessages(found, [])
  return (
    <>
      <RuledTable caption={caption} columns={headOf(columns, derivedColumns)} minWidth={640}>
        {grid.rows.map((row, index) => (
          <GridLine
            key={index}
            name={name}
            index={index}
            row={row}
            columns={columns}
            derivedColumns={derivedColumns}
            derived={derive(index)}
            errors={errorsOfRow(found, index)}
            acts={grid.acts}
            onBlur={grid.onBlur}
          />
        ))}
        {foot}
      </RuledTable>
      {rowMessage !== undefined && (
        <Typography role="alert" sx={{ color: 'error.main', fontWeight: 600, mt: 2 }}>
          {rowMessage}
        </Typography>
      )}
      <Box sx={{ display: 'flex', flexWrap: 'wrap', gap: 3, alignItems: 'center', mt: 3 }}>
        <Button
          aria-disabled={grid.steps === 0}
          onClick={grid.undo}
          sx={grid.steps === 0 ? { color: 'text.secondary', borderColor: 'divider' } : undefined}
        >
          Undo the last change
        </Button>
        <Typography variant="body2" sx={{ color: 'text.secondary' }}>
          Arrows and Enter move as in a spreadsheet. A block copied from one can be pasted into a cell.
        </Typography>
      </Box>
    </>
  )
}
