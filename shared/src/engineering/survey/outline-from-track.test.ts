import { describe, expect, it } from 'vitest'
import { outlineFromTrack, type TrackPosition } from './outline-from-track.js'
import { signedAreaFt2 } from './signed-area.js'

const ring = (...pairs: [number, number][]): TrackPosition[] => pairs.map(([lat, lon]) => ({ lat, lon }))
const metres = (feet: number) => feet * 0.3048
const squareMetres = (ft2: number) => ft2 * 0.3048 ** 2
const farm = ring([40, -90], [40, -89.999], [40.0005, -89.999], [40.0005, -90])

describe('outlineFromTrack', () => {
  it.each([
    ['around the north pole', ring([89, 0], [89, 90], [89, 180], [89, -90]), 631819.8745, 24952305678],
    ['around the south pole', ring([-89, 0], [-89, 90], [-89, 180], [-89, -90]), 631819.8745, 24952305678],
    ['across the equator', ring([0, -1], [-1, 0], [0, 1], [1, 0]), 627598.2731, 24619419146],
  ])('agrees with the published polygon %s (GeographicLib test set)', (_case, positions, perimeter, area) => {
    const outline = outlineFromTrack({ positions })
    expect(metres(outline.perimeterFt)).toBeCloseTo(perimeter, 3)
    expect(Math.abs(squareMetres(outline.areaFt2) - area)).toBeLessThan(2)
  })

  it('agrees with its own points in local feet within 1 in 100,000 on a farm', () => {
    const outline = outlineFromTrack({ positions: farm })
    expect(outline.areaAcres).toBeCloseTo(outline.areaFt2 / 43560, 12)
    expect(outline.pointsFt[0]).toEqual({ eastFt: 0, northFt: 0 })
    expect(signedAreaFt2(outline.pointsFt) / outline.areaFt2).toBeCloseTo(1, 5)
    expect(outline.pointsFt[2]?.eastFt).toBeGreaterThan(0)
    expect(outline.pointsFt[2]?.northFt).toBeGreaterThan(0)
  })

  it('is the same outline open or closed, either way round, with a position written twice', () => {
    const first = farm[0]
    const second = farm[1]
    if (!first || !second) throw new Error('four positions were written')
    const open = outlineFromTrack({ positions: farm })
    for (const positions of [
      [...farm, first],
      [...farm].reverse(),
      [first, first, second, ...farm.slice(1)],
    ]) {
      expect(outlineFromTrack({ positions }).areaFt2).toBeCloseTo(open.areaFt2, 3)
      expect(outlineFromTrack({ positions }).perimeterFt).toBeCloseTo(open.perimeterFt, 6)
      expect(outlineFromTrack({ positions }).pointsFt).toHaveLength(4)
    }
  })

  it.each<[string, TrackPosition[], string]>([
    ['no position', [], 'positions'],
    ['two positions', ring([40, -90], [41, -90], [40, -90]), 'positions'],
    ['positions on one line', ring([40, -90], [40.1, -90], [40.2, -90]), 'positions'],
    ['a latitude beyond the pole', ring([91, 0], [1, 1], [2, 1]), 'positions[0].lat'],
    ['a longitude that is no number', ring([1, 0], [1, NaN], [2, 1]), 'positions[1].lon'],
  ])('refuses %s', (_case, positions, field) => {
    expect(() => outlineFromTrack({ positions })).toThrow(expect.objectContaining({ field }))
  })

  it('refuses an outline that crosses itself and names the two legs', () => {
    const bowTie = ring([40, -90], [40.001, -89.999], [40.001, -90], [40, -89.999])
    expect(() => outlineFromTrack({ positions: bowTie })).toThrow(/Leg 1 of the track crosses leg 3/)
  })
})
