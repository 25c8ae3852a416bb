import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { traverse, type TraverseLeg } from './traverse.js'

const rectangle: TraverseLeg[] = [
  { bearing: 'N 0 E', distanceFt: 150 },
  { azimuthDeg: 90, distanceFt: 250 },
  { bearing: 'S 0 W', distanceFt: 150 },
  { azimuthDeg: 270, distanceFt: 250 },
]

describe('traverse', () => {
  it('gives a 250 by 150 ft pond 0.86 acre (Nebraska Pond Management, 2nd ed., p. 83)', () => {
    const walked = traverse({ legs: rectangle })
    expect(walked.areaFt2).toBeCloseTo(37500, 6)
    expect(walked.areaAcres).toBeCloseTo(0.86, 2)
    expect(walked.perimeterFt).toBe(800)
    expect(walked.closureErrorFt).toBe(0)
    expect(walked).not.toHaveProperty('closureRatio')
  })

  it('gives a triangle of base 300 and height 150 ft 0.52 acre (Nebraska Pond Management, 2nd ed., p. 83)', () => {
    const side = Math.hypot(150, 150)
    const walked = traverse({
      legs: [
        { azimuthDeg: 90, distanceFt: 300 },
        { bearing: 'N 45 W', distanceFt: side },
        { bearing: 'S 45 W', distanceFt: side },
      ],
    })
    expect(walked.areaFt2).toBeCloseTo(22500, 6)
    expect(walked.areaAcres).toBeCloseTo(0.52, 2)
  })

  it('reports the closure error and 1 in perimeter / error', () => {
    const walked = traverse({
      legs: rectangle.map((leg, index) => (index === 3 ? { ...leg, distanceFt: 248 } : leg)),
    })
    expect(walked.closureErrorFt).toBeCloseTo(2, 9)
    expect(walked.closureRatio).toBeCloseTo(399, 6)
  })

  it.each([
    ['N 45 30 E', 45.5],
    ['S 45 30 E', 134.5],
    ["s45°30'W", 225.5],
    ['N 45 30 30 W', 314.491666667],
    ['N 90 E', 90],
  ])('reads the bearing %s as azimuth %d', (bearing, azimuth) => {
    const legs = (leg: TraverseLeg) => [
      leg,
      { azimuthDeg: 10, distanceFt: 20 },
      { azimuthDeg: 170, distanceFt: 30 },
    ]
    const end = (leg: TraverseLeg) => traverse({ legs: legs(leg) }).points[1]
    const fromBearing = end({ bearing, distanceFt: 100 })
    const fromAzimuth = end({ azimuthDeg: azimuth, distanceFt: 100 })
    expect(fromBearing?.eastFt).toBeCloseTo(fromAzimuth?.eastFt ?? NaN, 6)
    expect(fromBearing?.northFt).toBeCloseTo(fromAzimuth?.northFt ?? NaN, 6)
  })

  it('keeps area and closure whatever the declination, and shows it', () => {
    fc.assert(
      fc.property(fc.integer({ min: -180, max: 180 }), (declinationDeg) => {
        const turned = traverse({ legs: rectangle, declinationDeg })
        expect(turned.areaFt2).toBeCloseTo(37500, 5)
        expect(turned.closureErrorFt).toBeLessThan(1e-6)
        expect(turned.declinationDeg).toBe(declinationDeg)
      }),
    )
  })

  it.each<[string, TraverseLeg[], string]>([
    ['two legs', rectangle.slice(0, 2), 'legs'],
    ['a bare bearing number', [{ bearing: '45', distanceFt: 1 }, ...rectangle], 'legs[0].bearing'],
    ['a bearing of 91 degrees', [{ bearing: 'N 91 E', distanceFt: 1 }, ...rectangle], 'legs[0].bearing'],
    ['75 minutes', [{ bearing: 'N 10 75 E', distanceFt: 1 }, ...rectangle], 'legs[0].bearing'],
    ['no direction', [{ distanceFt: 1 }, ...rectangle], 'legs[0].azimuthDeg'],
    ['two directions', [{ bearing: 'N 1 E', azimuthDeg: 1, distanceFt: 1 }, ...rectangle], 'legs[0].bearing'],
    ['a length of 0', [{ azimuthDeg: 1, distanceFt: 0 }, ...rectangle], 'legs[0].distanceFt'],
  ])('refuses %s', (_case, legs, field) => {
    expect(() => traverse({ legs })).toThrow(expect.objectContaining({ field }))
  })

  it('refuses a traverse that crosses itself and names both legs', () => {
    const legs = [
      { azimuthDeg: 45, distanceFt: 141.421356 },
      { azimuthDeg: 180, distanceFt: 100 },
      { azimuthDeg: 315, distanceFt: 141.421356 },
      { azimuthDeg: 180, distanceFt: 100 },
    ]
    expect(() => traverse({ legs })).toThrow(/Leg 1 crosses leg 3/)
  })
})
