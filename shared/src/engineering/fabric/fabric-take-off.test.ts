import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fabricTakeOff, type FabricTakeOffInput } from './fabric-take-off.js'

const ramp: FabricTakeOffInput = {
  slopeLengthFt: 56.43580423808985,
  wetLengthFt: 33.05525676802401,
  formationWidthFt: 21,
  sideTurnUpFt: 1,
  topAnchorFt: 2,
  toeWrapFt: 3,
  rollWidthFt: 15,
  rollLengthFt: 300,
  lapDryFt: 2,
  lapWetFt: 3,
}
/** Cover of exactly width by length, without turn-ups and ends. */
const plain = (widthFt: number, lengthFt: number, more: Partial<FabricTakeOffInput> = {}) =>
  fabricTakeOff({
    ...ramp,
    formationWidthFt: widthFt,
    slopeLengthFt: lengthFt,
    wetLengthFt: 0,
    sideTurnUpFt: 0,
    topAnchorFt: 0,
    toeWrapFt: 0,
    ...more,
  })

describe('fabricTakeOff', () => {
  it('covers formation, turn-ups, anchor and wrap, both ways (constructed example, no outside evidence)', () => {
    const fabric = fabricTakeOff(ramp)
    expect(fabric.coverWidthFt).toBe(23)
    expect(fabric.coverLengthFt).toBeCloseTo(61.43580423808985, 10)
    expect(fabric.netAreaFt2).toBeCloseTo(1413.0234974760665, 8)
    expect(fabric.along).toMatchObject({
      strips: 2,
      rolls: 1,
      piecesPerStrip: 1,
      joints: [{ atFt: 15, lapFt: 3 }],
    })
    expect(fabric.along.grossAreaFt2).toBeCloseTo(1843.0741271426955, 8)
    expect(fabric.along.lapAreaFt2).toBeCloseTo(184.30741271426956, 8)
    expect(fabric.across).toMatchObject({
      strips: 5,
      stripLengthFt: 23,
      grossAreaFt2: 1725,
      lapAreaFt2: 230,
      rolls: 1,
    })
    expect(fabric.across.joints).toEqual([
      { atFt: 15, lapFt: 3 },
      { atFt: 27, lapFt: 3 },
      { atFt: 39, lapFt: 2 },
      { atFt: 52, lapFt: 2 },
    ])
    expect(fabric).toMatchObject({ recommended: 'across', reason: 'same rolls, less gross area' })
  })

  it('takes one strip where the roll is as wide as the cover, and another for a foot more', () => {
    expect(plain(15, 40).along).toMatchObject({ strips: 1, lapAreaFt2: 0, trimAreaFt2: 0, joints: [] })
    expect(plain(16, 40).along.strips).toBe(2)
    expect(plain(28, 40).along.strips).toBe(2)
    expect(plain(28.1, 40).along.strips).toBe(3)
  })

  it('laps a drawn-down ramp dry everywhere', () => {
    const fabric = fabricTakeOff({ ...ramp, wetLengthFt: 0 })
    expect([...fabric.along.joints, ...fabric.across.joints].map(({ lapFt }) => lapFt)).toEqual(
      [...fabric.along.joints, ...fabric.across.joints].map(() => 2),
    )
  })

  it('cuts only whole strips from a roll', () => {
    expect(plain(40, 100).along).toMatchObject({ strips: 3, rolls: 1 })
    expect(plain(40, 101).along).toMatchObject({ strips: 3, rolls: 2 })
  })

  it('pieces a strip that is longer than a roll and shares rolls among the last pieces', () => {
    // 250 ft from 100-ft rolls, laps of 2: 100 + 98 + 52 + ... = 3 pieces, the last (250 + 4 − 200) = 54 ft.
    const { along } = plain(28, 250, { rollLengthFt: 100 })
    expect(along).toMatchObject({ strips: 2, piecesPerStrip: 3, rolls: 2 * 2 + 2 })
    expect(along.grossAreaFt2).toBeCloseTo(2 * 15 * 254, 9)
    expect(along.lapAreaFt2).toBeCloseTo(2 * 250 + 2 * 15 * 4, 9)
    // 240 ft: last piece 44 ft, two of them from one roll.
    expect(plain(28, 240, { rollLengthFt: 100 }).along.rolls).toBe(2 * 2 + 1)
  })

  it('prefers fewer rolls, then along', () => {
    expect(plain(15, 300)).toMatchObject({ recommended: 'along', reason: 'fewer rolls' })
    expect(plain(15, 15).recommended).toBe('along')
  })

  it('never trims a negative area, and covers at least the ground', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 5, max: 90 }),
        fc.integer({ min: 5, max: 400 }),
        fc.integer({ min: 0, max: 100 }),
        fc.integer({ min: 60, max: 500 }),
        (widthFt, lengthFt, wetPercent, rollLengthFt) => {
          const fabric = plain(widthFt, lengthFt, {
            wetLengthFt: (lengthFt * wetPercent) / 100,
            rollLengthFt,
          })
          for (const way of [fabric.along, fabric.across]) {
            const balance = way.grossAreaFt2 - fabric.netAreaFt2 - way.lapAreaFt2
            expect(balance).toBeGreaterThan(-1e-6)
            expect(way.trimAreaFt2).toBeCloseTo(balance, 6)
            expect(way.rolls * rollLengthFt * 15).toBeGreaterThanOrEqual(way.grossAreaFt2 - 1e-6)
          }
        },
      ),
    )
  })

  it.each<[Partial<FabricTakeOffInput>, string]>([
    [{ slopeLengthFt: 0 }, 'slopeLengthFt'],
    [{ formationWidthFt: NaN }, 'formationWidthFt'],
    [{ wetLengthFt: 57 }, 'wetLengthFt'],
    [{ wetLengthFt: -1 }, 'wetLengthFt'],
    [{ lapDryFt: 15 }, 'lapDryFt'],
    [{ lapWetFt: 15 }, 'lapWetFt'],
    [{ lapWetFt: 14.9999 }, 'rollWidthFt'],
    [{ rollLengthFt: 0 }, 'rollLengthFt'],
    [{ rollWidthFt: Infinity }, 'rollWidthFt'],
    [{ sideTurnUpFt: -1 }, 'sideTurnUpFt'],
    [{ topAnchorFt: -1 }, 'topAnchorFt'],
    [{ toeWrapFt: -1 }, 'toeWrapFt'],
  ])('refuses %o', (change, field) => {
    expect(() => fabricTakeOff({ ...ramp, ...change })).toThrow(expect.objectContaining({ field }))
  })
})
