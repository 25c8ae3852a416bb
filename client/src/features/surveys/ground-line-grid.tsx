import { CellGrid } from './cell-grid'
import { pointColumns } from './grid-columns'
import { useGridActs } from './use-grid-acts'

/** A ground line that was measured another way: stations toward the water, each with an elevation or a depth. */
export function GroundLineGrid() {
  const grid = useGridActs('points', pointColumns)
  return <CellGrid name="points" caption="Ground line, in feet" columns={pointColumns} grid={grid} />
}
