import { describe, expect, it } from 'vitest'
import { isInPolygon } from '../geometry/point-in-polygon.js'
import { ringArea } from '../geometry/ring-area.js'
import { pens } from '../pens.js'
import type { Point } from '../shapes.js'
import { lineHatch } from './line-hatch.js'
import { stoneHatch } from './stone-hatch.js'
import { waterHatch } from './water-hatch.js'

const notched: Point[] = [
  { x: 0, y: 0 },
  { x: 60, y: 0 },
  { x: 60, y: 40 },
  { x: 35, y: 12 },
  { x: 25, y: 12 },
  { x: 0, y: 40 },
]

describe('stoneHatch', () => {
  const hatch = (seed: number, stoneMm = 2) => stoneHatch({ ring: notched, stoneMm, slope: 0.2, seed })

  it('puts every stone wholly inside, also where the outline is notched', () => {
    const { rings } = hatch(3)
    expect(rings.length).toBeGreaterThan(50)
    expect(rings.flat().every((p) => isInPolygon(p, notched))).toBe(true)
  })

  it('lays the same stones for the same seed and others for another', () => {
    expect(hatch(3)).toEqual(hatch(3))
    expect(hatch(3)).not.toEqual(hatch(4))
  })

  it('draws fewer and larger stones rather than ever more small ones', () => {
    expect(hatch(3, 0.05).rings.length).toBeLessThanOrEqual(600)
  })

  it('covers most of the ground with stone, and never more than there is', () => {
    const square = [
      { x: 0, y: 0 },
      { x: 40, y: 0 },
      { x: 40, y: 40 },
      { x: 0, y: 40 },
    ]
    const stones = stoneHatch({ ring: square, stoneMm: 2, slope: 0, seed: 1 }).rings
    const covered = stones.reduce((sum, ring) => sum + ringArea(ring), 0)
    expect(covered / ringArea(square)).toBeGreaterThan(0.4)
    expect(covered / ringArea(square)).toBeLessThan(1)
  })
})

describe('waterHatch', () => {
  it('draws only strokes that lie wholly in the water, and none for a sliver', () => {
    expect(
      waterHatch(notched)
        .lines.flat()
        .every((p) => isInPolygon(p, notched)),
    ).toBe(true)
    expect(
      waterHatch([
        { x: 0, y: 0 },
        { x: 1, y: 0 },
      ]).lines,
    ).toEqual([])
  })
})

describe('lineHatch', () => {
  it('parts its lines at a notch and keeps their gap', () => {
    const { lines } = lineHatch({ ring: notched, angleDeg: 0, gapMm: 10, stroke: pens.fine })
    expect(lines.map((line) => line.map(({ y }) => y))).toEqual([
      [5, 5],
      [15, 15],
      [15, 15],
      [25, 25],
      [25, 25],
      [35, 35],
      [35, 35],
    ])
  })
})
