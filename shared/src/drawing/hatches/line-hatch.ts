import type { Point, PolylineShape, Stroke } from '../shapes.js'

interface LineHatch {
  ring: readonly Point[]
  angleDeg: number
  gapMm: number
  stroke: Stroke
}

const MOST_LINES = 4000

/** Parallel lines clipped to a polygon (even-odd), at a multiple of 15°. */
export function lineHatch({ ring, angleDeg, gapMm, stroke }: LineHatch): PolylineShape {
  const turn = (angleDeg * Math.PI) / 180
  const cos = Math.cos(turn)
  const sin = Math.sin(turn)
  const turned = ring.map((p) => ({ x: p.x * cos + p.y * sin, y: p.y * cos - p.x * sin }))
  const back = (x: number, y: number): Point => ({ x: x * cos - y * sin, y: x * sin + y * cos })
  const ys = turned.map((p) => p.y)
  const top = Math.min(...ys)
  const height = Math.max(...ys) - top
  const gap = Math.max(gapMm, height / MOST_LINES)
  const rows = Array.from(
    { length: Math.max(0, Math.floor(height / gap)) },
    (_, row) => top + (row + 0.5) * gap,
  )
  const lines = rows.flatMap((y) =>
    pairs(crossings(turned, y)).map(([from, to]) => [back(from, y), back(to, y)]),
  )
  return { kind: 'polyline', lines, stroke }
}

function crossings(ring: readonly Point[], y: number): number[] {
  return ring
    .flatMap((end, index) => {
      const start = ring[(index + ring.length - 1) % ring.length] ?? end
      if (start.y > y === end.y > y) return []
      return [start.x + ((y - start.y) / (end.y - start.y)) * (end.x - start.x)]
    })
    .sort((a, b) => a - b)
}

const pairs = (values: number[]): [number, number][] =>
  values.flatMap((value, index): [number, number][] => {
    const next = values[index + 1]
    return index % 2 === 0 && next !== undefined ? [[value, next]] : []
  })
