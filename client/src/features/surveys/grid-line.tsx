import Button from '@mui/material/Button'
import TableCell from '@mui/material/TableCell'
import TableRow from '@mui/material/TableRow'
import Typography from '@mui/material/Typography'
import { Fragment, memo, type ReactNode } from 'react'
import { errorId } from '../../components/fields/field-frame'
import { fieldId } from '../../components/fields/field-id'
import { FigureCell } from '../../components/layout/ruled-table'
import type { GridColumn, GridRow } from './grid-columns'
import { GridCell } from './grid-cell'
import { rowMessages } from './row-messages'
import type { GridActs } from './use-grid-acts'

/** A column that is worked out, right of the typed one of the key `after`. */
export interface DerivedColumn {
  after: string
  title: string
  isStrong?: boolean
}

interface GridLineProps {
  name: string
  index: number
  row: GridRow
  columns: readonly GridColumn[]
  derivedColumns: readonly DerivedColumn[]
  derived: readonly string[]
  errors: unknown
  acts: GridActs
  onBlur: () => void
}

/** One row of the grid: its number, typed cells, what follows from them, the acts on the row, and what is wrong. */
export const GridLine = memo(function GridLine(props: GridLineProps) {
  const { name, index, row, columns, derivedColumns, derived, errors, acts, onBlur } = props
  const { rowMessage, cellMessages } = rowMessages(errors, columns)
  return (
    <>
      <TableRow sx={{ '& > td': { verticalAlign: 'middle', fontSize: '0.9375rem' } }}>
        <TableCell className="figure" sx={{ color: 'text.secondary', width: 32, textAlign: 'right' }}>
          {index + 1}
        </TableCell>
        {columns.map((column, place) => (
          <Fragment key={column.key}>
            <GridCell
              name={`${name}.${index}.${column.key}`}
              column={column}
              at={{ row: index, column: place }}
              value={row[column.key] ?? ''}
              error={cellMessages.get(column.key)}
              acts={acts}
              onBlur={onBlur}
            />
            {derivedColumns.map(({ after, title, isStrong }, which) =>
              after === column.key ? (
                <FigureCell key={title} isStrong={isStrong}>
                  {derived[which]}
                </FigureCell>
              ) : null,
            )}
          </Fragment>
        ))}
        <TableCell sx={{ whiteSpace: 'nowrap', py: '0 !important', pl: '8px !important' }}>
          <Button
            variant="text"
            sx={{ mr: 4 }}
            aria-label={`Insert a row above row ${index + 1}`}
            onClick={() => acts.insert(index)}
          >
            Insert
          </Button>
          <Button variant="text" aria-label={`Take out row ${index + 1}`} onClick={() => acts.remove(index)}>
            Take out
          </Button>
        </TableCell>
      </TableRow>
      {(rowMessage !== undefined || cellMessages.size > 0) && (
        <TableRow>
          <TableCell colSpan={columns.length + derivedColumns.length + 2}>
            {rowMessage !== undefined && <Wrong>{rowMessage}</Wrong>}
            {columns.map(({ key, title }) =>
              cellMessages.has(key) ? (
                <Wrong key={key} id={errorId(fieldId(`${name}.${index}.${key}`))}>
                  Row {index + 1}, {title.toLowerCase()}: {cellMessages.get(key)}
                </Wrong>
              ) : null,
            )}
          </TableCell>
        </TableRow>
      )}
    </>
  )
}, isSameLine)

/**
 * The form hands out new copies of all rows at every key pressed, and figures that follow are new words each time: a
 * row is drawn again only where a cell or a figure reads otherwise.
 */
function isSameLine(before: GridLineProps, after: GridLineProps): boolean {
  const { derived: figuresBefore, row: rowBefore, ...restBefore } = before
  const { derived: figuresAfter, row: rowAfter, ...restAfter } = after
  const keys = Object.keys(restAfter) as (keyof typeof restAfter)[]
  return (
    keys.every((key) => Object.is(restBefore[key], restAfter[key])) &&
    after.columns.every(({ key }) => rowBefore[key] === rowAfter[key]) &&
    figuresBefore.join('\n') === figuresAfter.join('\n')
  )
}

function Wrong({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <Typography id={id} variant="body2" sx={{ color: 'error.main', fontWeight: 600 }}>
      {children}
    </Typography>
  )
}
