import { isInPolygon } from '../geometry/point-in-polygon.js'
import { ringArea } from '../geometry/ring-area.js'
import { boundsOf } from '../geometry/boxes.js'
import { seeded } from '../geometry/seeded.js'
import { pens } from '../pens.js'
import type { Point, PolygonShape } from '../shapes.js'

interface StoneHatch {
  ring: readonly Point[]
  /** Diameter on paper. */
  stoneMm: number
  /** Rows lie along this direction, so that a layer reads as laid on its slope. */
  slope: number
  seed: number
}

const MOST_STONES = 600

/** On paper a stone is never drawn smaller than an eye and a printer can tell apart from its neighbours. */
export const stoneOnPaperMm = (stoneSizeIn: number, mmPerFt: number) =>
  Math.max((stoneSizeIn / 12) * mmPerFt, 0.55 + 0.2 * Math.min(stoneSizeIn, 6))

/** Irregular stones in rows. A stone that would cross the edge is left out; the base tone shows there. */
export function stoneHatch({ ring, stoneMm, slope, seed }: StoneHatch): PolygonShape {
  const box = boundsOf(ring)
  const pitch = Math.max(stoneMm, Math.sqrt(ringArea(ring) / MOST_STONES / 0.86))
  const random = seeded(seed)
  const lift = Math.abs(slope) * (box.right - box.left)
  const rows = Math.ceil((box.bottom - box.top + lift) / (pitch * 0.86))
  const columns = Math.ceil((box.right - box.left) / pitch) + 1
  const top = box.top - (slope > 0 ? lift : 0)
  const rings: Point[][] = []
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const x = box.left + (column + (row % 2) / 2 + (random() - 0.5) * 0.25) * pitch
      const y = top + (row + 0.5 + (random() - 0.5) * 0.2) * pitch * 0.86 + slope * (x - box.left)
      if (!isInPolygon({ x, y }, ring)) continue
      const stone = stoneAt({ x, y }, pitch * (0.4 + random() * 0.12), random)
      if (stone.every((point) => isInPolygon(point, ring))) rings.push(stone)
    }
  }
  return { kind: 'polygon', rings: rings.slice(0, MOST_STONES), fill: 'stoneLight', stroke: pens.stoneEdge }
}

function stoneAt(middle: Point, radius: number, random: () => number): Point[] {
  const corners = 6
  const turn = random() * Math.PI
  return Array.from({ length: corners }, (_, corner) => {
    const angle = turn + (corner / corners) * Math.PI * 2 + (random() - 0.5) * 0.5
    const reach = radius * (0.82 + random() * 0.3)
    return { x: middle.x + Math.cos(angle) * reach * 1.08, y: middle.y + Math.sin(angle) * reach * 0.88 }
  })
}
