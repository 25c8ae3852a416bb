import type { Point, Shape, Sheet } from './shapes.js'

/** A hundredth of a millimetre is finer than any printer: rounding there makes a stored sheet three times smaller. */
const round = (mm: number) => Math.round(mm * 100) / 100
const roundPoint = ({ x, y }: Point): Point => ({ x: round(x), y: round(y) })

function roundShape(shape: Shape): Shape {
  if (shape.kind === 'text') return { ...shape, at: roundPoint(shape.at) }
  if (shape.kind === 'polyline') return { ...shape, lines: shape.lines.map((line) => line.map(roundPoint)) }
  return { ...shape, rings: shape.rings.map((ring) => ring.map(roundPoint)) }
}

/** A sheet as it is stored and compared. */
export const roundSheet = (sheet: Sheet): Sheet => ({ ...sheet, shapes: sheet.shapes.map(roundShape) })
