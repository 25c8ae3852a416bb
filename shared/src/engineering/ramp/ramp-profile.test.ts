import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { groundLine, profileInput } from '../../../examples/constructed-ramp.js'
import { rampProfile, type RampProfileInput } from './ramp-profile.js'

const profile = (change: Partial<RampProfileInput> = {}) => rampProfile({ ...profileInput, ...change })
const line = (...points: [number, number][]) =>
  points.map(([stationFt, elevationFt]) => ({ stationFt, elevationFt }))

describe('rampProfile', () => {
  it.each(
    Object.entries({
      topElevationFt: 101.5,
      toeElevationFt: 94.5,
      topStationFt: 43.6,
      toeStationFt: 99.6,
      riseFt: 7,
      runFt: 56,
      slopeLengthFt: 56.43580423808985,
      rockedLengthFt: 56.43580423808985,
      gradePercent: 12.5,
      gradeDegrees: 7.125016348901798,
      cosTheta: 0.9922778767136676,
      fullPoolEdgeStationFt: 55.6,
      waterTodayEdgeStationFt: 66.8,
      lowWaterEdgeStationFt: 87.6,
      wetRunAtFullFt: 44,
      wetSlopeLengthAtFullFt: 44.34241761564203,
      wetRunAtLowFt: 12,
      wetSlopeLengthAtLowFt: 12.093386622447825,
      wetSlopeLengthTodayFt: 33.05525676802401,
      groundAtTopFt: 101.5,
      groundAtToeFt: 94.632,
      toeMinusGroundFt: -0.132,
      drawdownServedFt: 4,
    }),
  )('gives %s as %d (constructed example, no outside evidence)', (name, figure) => {
    expect(new Map<string, unknown>(Object.entries(profile())).get(name)).toBeCloseTo(figure, 9)
  })

  it('is one straight surface from top to toe, mixed cut and fill (constructed example, no outside evidence)', () => {
    const { surface, toeGovernedBy, bankCase } = profile()
    expect(surface).toEqual([
      { stationFt: expect.closeTo(43.6, 9), elevationFt: 101.5, part: 'ramp' },
      { stationFt: expect.closeTo(99.6, 9), elevationFt: 94.5, part: 'ramp' },
    ])
    expect({ toeGovernedBy, bankCase }).toEqual({
      toeGovernedBy: 'low water - drinking depth',
      bankCase: 'mixed',
    })
  })

  it('prints 6:1 as 17 percent when rounded (K-State, Livestock Watering Handbook, Limited Access)', () => {
    expect(Math.round(profile({ gradeRunPerRise: 6 }).gradePercent)).toBe(17)
  })

  it('takes the lower of the two toe rules', () => {
    const { toeElevationFt, toeGovernedBy } = profile({ toeBelowFullPoolFt: 5.6 })
    expect(toeElevationFt).toBeCloseTo(94.4, 10)
    expect(toeGovernedBy).toBe('full pool - toe depth')
  })

  it('assumes a 4 ft fall of the level when low water is not known, and says so (K-State, George & Murphy)', () => {
    expect(profile({ lowWaterElevationFt: undefined })).toMatchObject({
      lowWaterElevationFt: 96,
      lowWaterIsAssumed: true,
    })
    const stated = profile({ lowWaterElevationFt: undefined, drawdownFt: 3 })
    expect(stated).toMatchObject({ lowWaterElevationFt: 97, lowWaterIsAssumed: false })
  })

  it('walks landward from the water, past a rut that reaches the top elevation first', () => {
    const rutted = [...line([-30, 104], [-20, 101], [-10, 104]), ...groundLine]
    expect(profile({ groundLine: rutted }).topStationFt).toBeCloseTo(43.6, 9)
  })

  it('joins a given top that stands above the ground by a falling approach', () => {
    // Ground at 46 is 101.2; 0.3 ft down at 10:1 against ground that rises 0.125 a foot meets at 0.3/(0.1 + 0.125).
    const [approach, top] = profile({ rampTopStationFt: 46 }).surface
    expect(approach).toMatchObject({ part: 'approach' })
    expect(approach?.stationFt).toBeCloseTo(46 - 0.3 / 0.225, 9)
    expect(top).toMatchObject({ stationFt: 46, part: 'ramp' })
  })

  it('joins a given top that lies below the ground by a rising approach, at the grade asked for', () => {
    // Ground at 42 is 101.7 and rises 0.4/7 a foot landward; at 5:1 the face gains 0.2 − 0.4/7 a foot on it.
    const [approach] = profile({ rampTopStationFt: 42, approachGradeRunPerRise: 5 }).surface
    expect(approach?.stationFt).toBeCloseTo(42 - 0.2 / (0.2 - 0.4 / 7), 9)
  })

  it('needs no approach where the ground is within 0.05 ft of the top', () => {
    expect(profile({ rampTopStationFt: 43.2 }).surface).toHaveLength(2)
  })

  it('adds a level landing and apron to the surface, the rocked length and the wet length', () => {
    const long = profile({
      apronLengthFt: 6,
      landingLengthFt: 5,
      rampTopStationFt: 43.6,
      approachGradeRunPerRise: 5,
    })
    expect(long.surface.map(({ part }) => part)).toEqual(['approach', 'landing', 'ramp', 'apron', 'apron'])
    expect(long.endStationFt).toBeCloseTo(105.6, 9)
    expect(long.rockedLengthFt).toBeCloseTo(56.43580423808985 + 11, 9)
    expect(long.wetRunAtLowFt).toBeCloseTo(18, 9)
    expect(long.wetSlopeLengthAtLowFt).toBeCloseTo(18.0933866224, 9)
  })

  it.each([
    [94, undefined, 0],
    [103, undefined, 56.4358042380898],
    [97, 79.6, 20.1556443707],
  ])('with water at %d ft today the edge is at %s and %d ft of slope are wet', (water, edge, wetFt) => {
    const today = profile({ waterSurfaceTodayFt: water })
    expect(today.wetSlopeLengthTodayFt).toBeCloseTo(wetFt, 9)
    if (edge === undefined) expect(today.waterTodayEdgeStationFt).toBeUndefined()
    else expect(today.waterTodayEdgeStationFt).toBeCloseTo(edge, 9)
  })

  it('says whether the ramp lies in the bank or on it', () => {
    const flat = line([0, 101.5], [60, 101.4], [61, 99], [200, 99])
    const steep = line([0, 102], [10, 101.5], [20, 90], [200, 89])
    expect(profile({ groundLine: flat, rampTopStationFt: 0 }).bankCase).toBe('cut')
    expect(profile({ groundLine: steep }).bankCase).toBe('fill')
  })

  it('shows the top against flood pool and dam when they are known', () => {
    const { topAboveFloodPoolFt, topBelowDamFt } = profile({
      floodPoolElevationFt: 102,
      topOfDamElevationFt: 105,
    })
    expect([topAboveFloodPoolFt, topBelowDamFt]).toEqual([-0.5, 3.5])
    expect(profile()).not.toHaveProperty('topBelowDamFt')
  })

  it('moves with the datum: levels and ground raised together change nothing else', () => {
    fc.assert(
      fc.property(fc.integer({ min: -500, max: 9000 }), (raise) => {
        const raised = rampProfile({
          ...profileInput,
          groundLine: groundLine.map((point) => ({ ...point, elevationFt: point.elevationFt + raise })),
          fullPoolElevationFt: 100 + raise,
          lowWaterElevationFt: 96 + raise,
        })
        expect(raised.topStationFt).toBeCloseTo(43.6, 6)
        expect(raised.runFt).toBeCloseTo(56, 6)
        expect(raised.drawdownServedFt).toBeCloseTo(4, 6)
      }),
    )
  })

  it('names the highest ground and both remedies when the ground never rises to the top', () => {
    expect(() => profile({ topAboveFullPoolFt: 4 })).toThrow(
      expect.objectContaining({
        field: 'topAboveFullPoolFt',
        message: expect.stringMatching(
          /103\.2 ft at station 0, .*Build the top in fill and enter its station, or lower/,
        ),
      }),
    )
  })

  it('says what is wrong when the ground never falls to full pool', () => {
    const dry = groundLine.slice(0, 5)
    expect(() => profile({ groundLine: dry })).toThrow(
      expect.objectContaining({
        field: 'groundLine',
        message: expect.stringContaining('never falls to full pool'),
      }),
    )
  })

  it('says how far the survey must reach when it ends before the toe', () => {
    expect(() => profile({ groundLine: groundLine.slice(0, 9) })).toThrow(
      expect.objectContaining({
        field: 'groundLine',
        message: 'The survey ends at station 85; it must reach at least station 99.6.',
      }),
    )
  })

  it('says how far landward the survey must begin when the approach runs off it', () => {
    expect(() =>
      profile({ groundLine: groundLine.slice(3), rampTopStationFt: 42.5, approachGradeRunPerRise: 5 }),
    ).toThrow(/^The survey begins at station 42; it must reach at least station 40\.667\.$/)
  })

  it.each<[Partial<RampProfileInput>, string]>([
    [{ groundLine: [] }, 'groundLine'],
    [{ groundLine: [...groundLine].reverse() }, 'groundLine'],
    [{ fullPoolElevationFt: NaN }, 'fullPoolElevationFt'],
    [{ lowWaterElevationFt: 101 }, 'lowWaterElevationFt'],
    [{ topAboveFullPoolFt: -1 }, 'topAboveFullPoolFt'],
    [{ toeBelowFullPoolFt: Infinity }, 'toeBelowFullPoolFt'],
    [{ drinkingDepthAtLowWaterFt: -1 }, 'drinkingDepthAtLowWaterFt'],
    [{ gradeRunPerRise: 0 }, 'gradeRunPerRise'],
    [{ rampTopStationFt: -5 }, 'rampTopStationFt'],
    [{ rampTopStationFt: NaN }, 'rampTopStationFt'],
    [{ apronLengthFt: -1 }, 'apronLengthFt'],
    [{ landingLengthFt: NaN }, 'landingLengthFt'],
    [{ approachGradeRunPerRise: 0 }, 'approachGradeRunPerRise'],
    [{ waterSurfaceTodayFt: NaN }, 'waterSurfaceTodayFt'],
    [{ floodPoolElevationFt: NaN }, 'floodPoolElevationFt'],
    [
      {
        topAboveFullPoolFt: 0,
        toeBelowFullPoolFt: 0,
        lowWaterElevationFt: 100,
        drinkingDepthAtLowWaterFt: 0,
      },
      'toeBelowFullPoolFt',
    ],
  ])('refuses %o', (change, field) => {
    expect(() => profile(change)).toThrow(expect.objectContaining({ field }))
  })
})
