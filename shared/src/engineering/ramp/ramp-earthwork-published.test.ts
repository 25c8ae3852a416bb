import { describe, expect, it } from 'vitest'
import { rampEarthwork, type RampEarthworkInput } from './ramp-earthwork.js'

/** A level formation without rock, and ground that stands above it (or below) by the given heights. */
const onLevel = (
  points: [number, number][],
  change: Partial<RampEarthworkInput> = {},
  { beyondFall = 0 } = {},
) => {
  const heights = points.map(([stationFt, elevationFt]) => ({ stationFt, elevationFt }))
  const to = points.at(-1)?.[0] ?? 0
  const surface = [0, to].map((stationFt) => ({ stationFt, elevationFt: 0, part: 'ramp' as const }))
  return rampEarthwork({
    groundLine: [
      ...heights,
      { stationFt: to + 100, elevationFt: (points.at(-1)?.[1] ?? 0) - 100 * beyondFall },
    ],
    profile: { surface },
    widthFt: 20,
    edgeAllowanceFt: 0,
    rockThicknessIn: 0,
    cutSideRunPerRise: 1.5,
    fillSideRunPerRise: 1.5,
    stationIntervalFt: 1000,
    ...change,
  })
}

describe('rampEarthwork on a level formation', () => {
  it('gives a cutting 20 ft wide at 1.5:1 through 0-5-10-15-0 ft 52,500 ft3 by the prismoidal formula and 56,250 by end areas (Vose, Handbook of Railroad Construction, recomputed)', () => {
    const cut = onLevel([
      [0, 0],
      [50, 5],
      [100, 10],
      [150, 15],
      [200, 0],
    ])
    expect(cut.sections.map(({ cutAreaFt2 }) => cutAreaFt2)).toEqual([0, 137.5, 350, 637.5, 0])
    expect(cut.prismoidal.cutYd3 * 27).toBeCloseTo(52500, 6)
    expect(cut.averageEndArea.cutYd3 * 27).toBeCloseTo(56250, 6)
  })

  it('gives a bank 11 wide at 2:1 from 0.5 to 2.5 high over 150 the volumes 3,250 and 3,450 (published railway bank example, recomputed)', () => {
    const bank = onLevel(
      [
        [0, -0.5],
        [150, -2.5],
      ],
      { widthFt: 11, fillSideRunPerRise: 2 },
    )
    expect(bank.prismoidal.fillYd3 * 27).toBeCloseTo(3250, 6)
    expect(bank.averageEndArea.fillYd3 * 27).toBeCloseTo(3450, 6)
  })

  it.each([
    [1, 68],
    [2, 137],
    [3, 208],
    [4, 282],
    [5, 356],
    [6, 433],
    [7, 512],
    [8, 593],
    [9, 675],
    [10, 759],
  ])(
    'gives a rock cut 18 ft wide at 1/4:1 and %d ft deep %d yd3 per 100 ft (Vose, Handbook of Railroad Construction, table)',
    (depth, yd3) => {
      const cut = onLevel(
        [
          [0, depth],
          [100, depth],
        ],
        { widthFt: 18, cutSideRunPerRise: 0.25 },
      )
      // The book prints 281.48 as 282.
      expect(Math.abs(cut.prismoidal.cutYd3 - yd3)).toBeLessThanOrEqual(0.52)
    },
  )

  it('closes a formation that hangs above a level bed with a nose of s·h(B·h/2 + s·h²/3)', () => {
    const nose = onLevel(
      [
        [0, -3],
        [50, -3],
      ],
      { widthFt: 21, fillSideRunPerRise: 3 },
    ).ends[0]
    expect(nose).toMatchObject({ part: 'nose', fromStationFt: 50, toStationFt: 59 })
    expect((nose?.prismoidal.fillYd3 ?? 0) * 27).toBeCloseTo(364.5, 8)
  })

  it('ends a formation under a bed that falls q a foot with an end cut of reach d/(1/s + q)', () => {
    const endCut = onLevel(
      [
        [0, 4],
        [40, 2],
      ],
      { widthFt: 21, cutSideRunPerRise: 3 },
      { beyondFall: 0.05 },
    ).ends[0]
    const reachFt = 2 / (1 / 3 + 0.05)
    expect(endCut).toMatchObject({ part: 'end-cut', fromStationFt: 40 })
    expect(endCut?.toStationFt).toBeCloseTo(40 + reachFt, 9)
    expect((endCut?.prismoidal.cutYd3 ?? 0) * 27).toBeCloseTo(reachFt * ((21 * 2) / 2 + (3 * 4) / 3), 8)
  })
})
