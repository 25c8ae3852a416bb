import Box from '@mui/material/Box'
import Table from '@mui/material/Table'
import TableBody from '@mui/material/TableBody'
import TableCell from '@mui/material/TableCell'
import TableHead from '@mui/material/TableHead'
import TableRow from '@mui/material/TableRow'
import type { ReactNode } from 'react'

export interface Column {
  key: string
  title: string
  isFigure?: boolean
  width?: number | string
}

interface RuledTableProps {
  /** Told to screen readers; the heading above tells it to all others. */
  caption: string
  columns: readonly Column[]
  minWidth?: number
  children: ReactNode
}

/**
 * A table ruled like a field book. Where it is wider than the screen it scrolls by itself, also by keyboard. It is
 * positioned, so that words hidden for the eye stay inside and do not widen the page.
 */
export function RuledTable({ caption, columns, minWidth, children }: RuledTableProps) {
  return (
    <Box role="region" aria-label={caption} tabIndex={0} sx={{ overflowX: 'auto', position: 'relative' }}>
      <Table sx={{ minWidth }}>
        <caption className="visually-hidden">{caption}</caption>
        <TableHead>
          <TableRow>
            {columns.map((column) => (
              <TableCell
                key={column.key}
                scope="col"
                align={column.isFigure ? 'right' : 'left'}
                sx={{ width: column.width }}
              >
                {column.title || <span className="visually-hidden">Acts</span>}
              </TableCell>
            ))}
          </TableRow>
        </TableHead>
        <TableBody>{children}</TableBody>
      </Table>
    </Box>
  )
}

interface FigureCellProps {
  children: ReactNode
  unit?: string
  isStrong?: boolean
}

/** A figure, right-aligned, with its unit in lighter ink. */
export function FigureCell({ children, unit, isStrong = false }: FigureCellProps) {
  return (
    <TableCell
      align="right"
      className="figure"
      sx={{ fontWeight: isStrong ? 600 : undefined, whiteSpace: 'nowrap' }}
    >
      {children}
      {unit && (
        <Box component="span" sx={{ color: 'text.secondary', fontWeight: 400 }}>
          {'\u00a0'}
          {unit}
        </Box>
      )}
    </TableCell>
  )
}

/** The row of sums under a double rule. */
export function SumRow({ children }: { children: ReactNode }) {
  return (
    <TableRow sx={{ '& > td, & > th': { borderTop: '3px double', borderBottom: 0, fontWeight: 600 } }}>
      {children}
    </TableRow>
  )
}
