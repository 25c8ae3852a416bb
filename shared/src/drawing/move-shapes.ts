import type { Point, Shape } from './shapes.js'

/** The same shapes somewhere else on the paper. */
export function moveShapes<Kind extends Shape>(shapes: readonly Kind[], by: Point): Kind[] {
  const moved = ({ x, y }: Point): Point => ({ x: x + by.x, y: y + by.y })
  return shapes.map((shape) => {
    if (shape.kind === 'text') return { ...shape, at: moved(shape.at) }
    if (shape.kind === 'polyline') return { ...shape, lines: shape.lines.map((line) => line.map(moved)) }
    return { ...shape, rings: shape.rings.map((ring) => ring.map(moved)) }
  })
}
