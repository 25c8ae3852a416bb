import { pens, typeMm } from '../pens.js'
import { polyline, textAt } from '../shape-makers.js'
import type { Box, Shape } from '../shapes.js'

export interface BandColumn {
  /** Where on the drawing above the column belongs. */
  xMm: number
  cells: string[]
}

interface DataBand {
  box: Box
  /** Names of the rows, written left of the box. */
  names: string[]
  columns: BandColumn[]
  leastGapMm: number
}

const JOG_MM = 4

/** The table under a profile: each column stands under its station, pushed aside only as far as it must. */
export function dataBand({ box, names, columns, leastGapMm }: DataBand): Shape[] {
  const top = box.top + JOG_MM
  const rowMm = (box.bottom - top) / names.length
  const places = spread(
    columns.map((column) => column.xMm),
    leastGapMm,
    box,
  )
  const rules = Array.from({ length: names.length + 1 }, (_, row) => [
    { x: box.left - 22, y: top + row * rowMm },
    { x: box.right, y: top + row * rowMm },
  ])
  const jogs = columns.map((column, index) => [
    { x: column.xMm, y: box.top - 1.5 },
    { x: column.xMm, y: box.top + 0.8 },
    { x: places[index] ?? column.xMm, y: top },
  ])
  const texts = columns.flatMap((column, index) =>
    column.cells.map((cell, row) =>
      textAt(
        cell,
        { x: places[index] ?? column.xMm, y: top + (row + 0.72) * rowMm },
        {
          align: 'center',
          sizeMm: typeMm.small,
          weight: row === 0 ? 'bold' : 'regular',
        },
      ),
    ),
  )
  const heads = names.map((name, row) =>
    textAt(name, { x: box.left - 22, y: top + (row + 0.72) * rowMm }, { sizeMm: typeMm.small, tone: 'mute' }),
  )
  return [
    { kind: 'polyline', lines: rules, stroke: pens.grid },
    { kind: 'polyline', lines: jogs, stroke: pens.fine },
    polyline(
      [
        { x: box.left, y: box.top },
        { x: box.right, y: box.top },
      ],
      pens.outline,
    ),
    ...heads,
    ...texts,
  ]
}

/** Pushes crowded columns apart to the right, then back from the right edge. */
export function spread(wanted: number[], gap: number, box: Pick<Box, 'left' | 'right'>): number[] {
  const pushed: number[] = []
  wanted.forEach((x) => pushed.push(Math.max(x, (pushed.at(-1) ?? -Infinity) + gap)))
  let limit = box.right - gap / 2
  return pushed
    .reverse()
    .map((x) => {
      const kept = Math.min(x, limit)
      limit = kept - gap
      return kept
    })
    .reverse()
}
