import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ridgeSection, type RidgeSectionInput, type RidgeSectionResult } from './ridge-section.js'

const refusal = (field: string) => expect.objectContaining({ name: 'EngineeringInputError', field })

const job: RidgeSectionInput = {
  crestHeightFt: 1.067196296617488,
  topWidthFt: 4,
  upslopeRunPerRise: 4,
  downslopeRunPerRise: 4,
  groundFallFtPerFt: 1 / 30,
  settlementPercent: 10,
}

/** Area of the built section by its corners, the origin on the ground below the middle of the crest. */
function areaByCorners(ridge: RidgeSectionResult, t: number, q: number): number {
  const corners = [
    { x: -t / 2 - ridge.upslopeReachFt, y: q * (t / 2 + ridge.upslopeReachFt) },
    { x: -t / 2, y: ridge.builtHeightFt },
    { x: t / 2, y: ridge.builtHeightFt },
    { x: t / 2 + ridge.downslopeReachFt, y: -q * (t / 2 + ridge.downslopeReachFt) },
  ]
  const twice = corners.reduce((sum, corner, index) => {
    const next = corners[(index + 1) % corners.length] ?? corner
    return sum + corner.x * next.y - next.x * corner.y
  }, 0)
  return Math.abs(twice) / 2
}

describe('ridgeSection', () => {
  it('gives 13.7598 ft² on ground that falls 1 in 30 (constructed example, no outside evidence)', () => {
    const ridge = ridgeSection(job)
    expect(ridge.settledHeightFt).toBeCloseTo(1.276155802833153, 12)
    expect(ridge.builtHeightFt).toBeCloseTo(1.4037713831164684, 12)
    expect(ridge.upslopeReachFt).toBeCloseTo(4.719193116881653, 12)
    expect(ridge.downslopeReachFt).toBeCloseTo(6.7866371528452385, 12)
    expect(ridge.areaFt2).toBeCloseTo(13.759777969483585, 11)
    expect(ridge.baseWidthFt).toBeCloseTo(15.505830269726893, 11)
  })

  it('does not give the 10.21 ft² of the level-ground formula there (constructed example, no outside evidence)', () => {
    const level = ridgeSection({ ...job, groundFallFtPerFt: 0 })
    expect(level.areaFt2).toBeCloseTo(10.207978113005103, 11)
    expect(ridgeSection(job).areaFt2).toBeGreaterThan(level.areaFt2 * 1.3)
  })

  it('gives 14.46 ft² for h 1.40 ft, 10 %, faces 4:1 and 3:1 on level ground (constructed example, no outside evidence)', () => {
    const ridge = ridgeSection({
      ...job,
      crestHeightFt: 1.4,
      downslopeRunPerRise: 3,
      groundFallFtPerFt: 0,
    })
    expect(ridge.areaFt2).toBeCloseTo(14.46, 2)
  })

  it('gives 855 for a section 14 wide on top, 100 below and 15 high (published exercise on fill sections)', () => {
    const z = (100 - 14) / 2 / 15
    const ridge = ridgeSection({
      crestHeightFt: 15,
      topWidthFt: 14,
      upslopeRunPerRise: z,
      downslopeRunPerRise: z,
      groundFallFtPerFt: 0,
      settlementPercent: 0,
    })
    expect(ridge.areaFt2).toBeCloseTo(855, 9)
    expect(ridge.baseWidthFt).toBeCloseTo(100, 9)
  })

  it('has the area of the polygon of its corners', () => {
    const number = (min: number, max: number) => fc.double({ min, max, noNaN: true })
    fc.assert(
      fc.property(
        number(0, 5),
        number(0, 10),
        number(0.5, 8),
        number(0.5, 8),
        number(0, 0.1),
        (h, t, z1, z2, q) => {
          const ridge = ridgeSection({
            crestHeightFt: h,
            topWidthFt: t,
            upslopeRunPerRise: z1,
            downslopeRunPerRise: z2,
            groundFallFtPerFt: q,
            settlementPercent: 5,
          })
          expect(ridge.areaFt2).toBeCloseTo(areaByCorners(ridge, t, q), 8)
        },
      ),
    )
  })

  it('refuses a downslope face that never meets the ground', () => {
    const input = { ...job, groundFallFtPerFt: 0.25 }
    expect(() => ridgeSection(input)).toThrow(refusal('downslopeRunPerRise'))
    expect(() => ridgeSection({ ...input, downslopeRunPerRise: 3.9 })).not.toThrow()
  })

  it.each([
    ['crestHeightFt', { crestHeightFt: -1 }],
    ['topWidthFt', { topWidthFt: NaN }],
    ['upslopeRunPerRise', { upslopeRunPerRise: -1 }],
    ['downslopeRunPerRise', { downslopeRunPerRise: Infinity }],
    ['groundFallFtPerFt', { groundFallFtPerFt: -0.01 }],
    ['settlementPercent', { settlementPercent: 101 }],
  ])('refuses a bad %s by name', (field, change) => {
    expect(() => ridgeSection({ ...job, ...change })).toThrow(refusal(field))
  })
})
