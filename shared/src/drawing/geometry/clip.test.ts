import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Box, Point } from '../shapes.js'
import { holdsPoint } from './boxes.js'
import { clipPolygon } from './clip-polygon.js'
import { clipPolyline } from './clip-polyline.js'
import { ringArea } from './ring-area.js'

const box: Box = { left: 0, top: 0, right: 10, bottom: 10 }
const point = fc.record({
  x: fc.double({ min: -20, max: 30, noNaN: true }),
  y: fc.double({ min: -20, max: 30, noNaN: true }),
})
const length = (line: readonly Point[]) =>
  line
    .slice(1)
    .reduce(
      (sum, end, index) => sum + Math.hypot(end.x - (line[index]?.x ?? 0), end.y - (line[index]?.y ?? 0)),
      0,
    )

describe('clipPolyline', () => {
  it('cuts a line that crosses the whole box exactly at its edges', () => {
    expect(
      clipPolyline(
        [
          { x: -5, y: 5 },
          { x: 15, y: 5 },
        ],
        box,
      ),
    ).toEqual([
      [
        { x: 0, y: 5 },
        { x: 10, y: 5 },
      ],
    ])
  })

  it('parts a line that leaves the box and comes back', () => {
    const line = [
      { x: 5, y: 5 },
      { x: 15, y: 5 },
      { x: 15, y: 8 },
      { x: 5, y: 8 },
    ]
    expect(clipPolyline(line, box)).toEqual([
      [
        { x: 5, y: 5 },
        { x: 10, y: 5 },
      ],
      [
        { x: 10, y: 8 },
        { x: 5, y: 8 },
      ],
    ])
  })

  it('keeps every point inside and never makes a line longer', () => {
    fc.assert(
      fc.property(fc.array(point, { minLength: 2, maxLength: 8 }), (line) => {
        const parts = clipPolyline(line, box)
        expect(parts.flat().every((p) => holdsPoint(box, p, 1e-6))).toBe(true)
        expect(parts.reduce((sum, part) => sum + length(part), 0)).toBeLessThanOrEqual(length(line) + 1e-6)
      }),
    )
  })
})

describe('clipPolygon', () => {
  it('cuts a square that hangs over a corner to its quarter', () => {
    const square = [
      { x: 5, y: 5 },
      { x: 15, y: 5 },
      { x: 15, y: 15 },
      { x: 5, y: 15 },
    ]
    expect(ringArea(clipPolygon(square, box))).toBeCloseTo(25, 9)
  })

  it('keeps every point inside and never makes an area larger than the box', () => {
    fc.assert(
      fc.property(fc.array(point, { minLength: 3, maxLength: 8 }), (ring) => {
        const cut = clipPolygon(ring, box)
        expect(cut.every((p) => holdsPoint(box, p, 1e-6))).toBe(true)
        expect(ringArea(cut)).toBeLessThanOrEqual(100 + 1e-6)
      }),
    )
  })
})
