import TableCell from '@mui/material/TableCell'
import { numberText } from 'shared'
import { FigureCell, SumRow } from '../../components/layout/ruled-table'
import { CellGrid } from './cell-grid'
import { noteColumns } from './grid-columns'
import type { DerivedColumn } from './grid-line'
import { LevelNotesCsv } from './level-notes-csv'
import type { SurveySoFar } from './reduce-so-far'
import { useGridActs } from './use-grid-acts'

const derivedColumns: readonly DerivedColumn[] = [
  { after: 'backsightFt', title: 'Instrument' },
  { after: 'foresightFt', title: 'Elevation', isStrong: true },
]

interface LevelNotesGridProps {
  soFar: SurveySoFar
}

/** The field book: heights of instrument and elevations appear as the sights are typed. */
export function LevelNotesGrid({ soFar }: LevelNotesGridProps) {
  const grid = useGridActs('rows', noteColumns)
  const { reduction } = soFar

  const derive = (index: number): readonly string[] => {
    const point = reduction?.points[index]
    if (point === undefined) return ['', '']
    const isSetup = (grid.rows[index]?.backsightFt ?? '').trim() !== ''
    return [isSetup ? numberText(point.instrumentHeightFt, 2) : '', numberText(point.elevationFt, 2)]
  }

  return (
    <>
      <CellGrid
        name="rows"
        caption="Level notes, in feet"
        columns={noteColumns}
        derivedColumns={derivedColumns}
        derive={derive}
        grid={grid}
        foot={
          reduction && (
            <SumRow>
              <TableCell />
              <TableCell component="th" scope="row" colSpan={2}>
                Sums
              </TableCell>
              <FigureCell>{numberText(reduction.sumBacksightFt, 2)}</FigureCell>
              <TableCell colSpan={2} />
              <FigureCell>{numberText(reduction.sumForesightFt, 2)}</FigureCell>
              <FigureCell>{numberText(reduction.differenceFt, 2)}</FigureCell>
              <TableCell colSpan={2} />
            </SumRow>
          )
        }
      />
      <LevelNotesCsv onRead={grid.change} />
    </>
  )
}
