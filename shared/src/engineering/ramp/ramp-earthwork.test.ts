import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { earthworkInput, groundLine, profileInput } from '../../../examples/constructed-ramp.js'
import { averageEndAreaYd3 } from './average-end-area-yd3.js'
import { rampEarthwork, type RampEarthworkInput } from './ramp-earthwork.js'
import { rampProfile } from './ramp-profile.js'

const profile = rampProfile(profileInput)
const earthwork = (change: Partial<RampEarthworkInput> = {}) =>
  rampEarthwork({ groundLine, profile, ...earthworkInput, ...change })

describe('rampEarthwork', () => {
  it.each<['averageEndArea' | 'prismoidal', object]>([
    [
      'averageEndArea',
      {
        cutYd3: 16.581641095770497,
        fillYd3: 2.10328966567129,
        wetCutYd3: 13.323096761888369,
        wetFillYd3: 0.7025157249945622,
        edgeBackfillYd3: 2.495505591269145,
      },
    ],
    [
      'prismoidal',
      {
        cutYd3: 16.489200365955234,
        fillYd3: 2.101830442020544,
        wetCutYd3: 13.277074572467743,
        dryCutYd3: 3.212125793487491,
        wetFillYd3: 0.702256110712717,
        edgeBackfillYd3: 2.3582642298796075,
      },
    ],
  ])('gives the volumes of the ramp by %s (constructed example, no outside evidence)', (way, volumes) => {
    const measured = new Map<string, number>(Object.entries(earthwork()[way]))
    for (const [name, figure] of Object.entries(volumes)) expect(measured.get(name)).toBeCloseTo(figure, 9)
  })

  it('stands a section at every interval, break and crossing (constructed example, no outside evidence)', () => {
    const sections = earthwork().sections.filter(({ part }) => part === 'ramp')
    const stations = [
      43.6, 46, 48.46803808621382, 49, 53.6, 57.461538461538474, 58.73774225170155, 60, 63.6,
      68.5330668877613, 72, 73.6, 83.6, 85, 93.6, 96.66666666666686, 99.6,
    ]
    expect(sections).toHaveLength(stations.length)
    stations.forEach((station, index) => expect(sections[index]?.stationFt).toBeCloseTo(station, 8))
    const areas = {
      groundFt: 95.92923,
      finishedFt: 96.5,
      formationFt: 95.49222,
      cutAreaFt2: 9.75021,
      wetCutAreaFt2: 9.75021,
    }
    for (const [name, figure] of Object.entries({ ...areas, edgeBackfillAreaFt2: 0.85941, fillAreaFt2: 0 })) {
      expect(new Map<string, unknown>(Object.entries(sections[12] ?? {})).get(name)).toBeCloseTo(figure, 5)
    }
    expect(sections[3]?.fillAreaFt2).toBeCloseTo(4.703124104467285, 9)
    expect(sections[6]?.wetFillAreaFt2).toBeCloseTo(3.235549483339505, 9)
  })

  it('cuts past the toe up to the bed, in addition to the ramp, along the surveyed bed', () => {
    const { ends, total, prismoidal } = earthwork()
    expect(ends.map(({ part }) => part)).toEqual(['end-cut'])
    const [endCut] = ends
    // At station 100 the face stands 0.97445 ft under the bed, which falls 0.06 a foot from there.
    const atHundredFt = 94.6 - (94.5 - 1.0077822185373186 + 0.4 / 3)
    expect(endCut?.toStationFt).toBeCloseTo(100 + atHundredFt / (1 / 3 + 0.06), 9)
    // A straight bed from the toe to station 115 would give 1.4220 yd3 (constructed example, no outside evidence).
    expect(Math.abs((endCut?.prismoidal.cutYd3 ?? 0) - 1.422)).toBeLessThan(0.02)
    expect(endCut?.prismoidal.wetCutYd3).toBe(endCut?.prismoidal.cutYd3)
    expect(total.prismoidal.cutYd3).toBeCloseTo(prismoidal.cutYd3 + (endCut?.prismoidal.cutYd3 ?? NaN), 9)
  })

  it('balances all of it: ramp and ends together, by exact volumes', () => {
    const { balance, total } = earthwork({ otherDryCutYd3: 4.444444444444445 })
    expect(balance.dryCutBankYd3).toBeCloseTo(7.656570237931936, 8)
    expect(balance.wetCutBankYd3).toBe(total.prismoidal.wetCutYd3)
    expect(balance.bankNeededYd3).toBeCloseTo(4.955660746555724, 8)
    expect(earthwork().balance.borrowBankYd3).toBeCloseTo(4.955660746555724 - 3.212125793487491, 8)
  })

  it.each([
    [{}, 21, 16.489200365955234],
    [{ edgeRunPerRise: 0, edgeAllowanceFt: 1.5 }, 21, 16.489200365955234],
    [{ edgeRunPerRise: 0 }, 18, 14.364661193902826],
    [{ edgeRunPerRise: 0, cutSideRunPerRise: 0 }, 18, (18 / 3) * (16.489200365955234 - 14.364661193902826)],
  ])(
    'with %o the formation is %d ft wide (constructed example, no outside evidence)',
    (change, widthFt, cutYd3) => {
      const measured = earthwork(change)
      expect(measured.formationWidthFt).toBe(widthFt)
      expect(measured.prismoidal.cutYd3).toBeCloseTo(cutYd3, 9)
      expect(measured.verticalRockThicknessFt).toBeCloseTo(1.0077822185373186, 12)
    },
  )

  it('backfills nothing in a trench with upright edges, and the working room where there is one', () => {
    expect(earthwork({ edgeRunPerRise: 0, cutSideRunPerRise: 0 }).prismoidal.edgeBackfillYd3).toBe(0)
    const top = earthwork({ edgeRunPerRise: 0, edgeAllowanceFt: 1.5 }).sections[0]
    expect(top?.edgeBackfillAreaFt2).toBeCloseTo(3 * 1.0077822185373186 ** 2 + 3 * 1.0077822185373186, 9)
  })

  it('measures the earth of an approach beside the ramp, with no rock under it', () => {
    const high = rampProfile({ ...profileInput, rampTopStationFt: 46 })
    const { ends, sections } = earthwork({ profile: high })
    const approach = ends.find(({ part }) => part === 'approach')
    expect(approach?.toStationFt).toBe(46)
    expect(approach?.prismoidal.fillYd3).toBeGreaterThan(0)
    for (const section of sections.filter(({ part }) => part === 'approach')) {
      expect(section.formationFt).toBe(section.finishedFt)
      expect(section.edgeBackfillAreaFt2).toBe(0)
    }
  })

  it('takes rock plumb on a level apron as thick as square to it', () => {
    const flat = rampProfile({ ...profileInput, apronLengthFt: 5 })
    const apron = earthwork({ profile: flat }).sections.filter(({ part }) => part === 'apron')
    expect(apron.length).toBeGreaterThan(1)
    for (const { finishedFt, formationFt } of apron) expect(finishedFt - formationFt).toBeCloseTo(1, 12)
  })

  it('counts all cut as dry when no water level is given', () => {
    const dry = earthwork({ waterSurfaceTodayFt: undefined }).total.prismoidal
    expect(dry.wetCutYd3).toBe(0)
    expect(dry.wetFillYd3).toBe(0)
    expect(dry.dryCutYd3).toBe(dry.cutYd3)
  })

  it('strips topsoil only where the ground is out of the water, and takes it out of the balance', () => {
    const { stripping, balance } = earthwork({ stripDepthIn: 6 })
    const plain = earthwork().balance
    // Cut footprint 43.6–48.468, fill footprint on to the water at 57.4615.
    expect(stripping.strippedYd3).toBeCloseTo(stripping.fromCutYd3 + stripping.underFillYd3, 12)
    expect(stripping.fromCutYd3 * 27 * 2).toBeCloseTo(
      2.4 * (21 + 6 * 1.0077822) + 2.468038 * (21 + 3 * 1.0077822),
      3,
    )
    expect(stripping.underFillYd3).toBeGreaterThan(0)
    expect(balance.dryCutBankYd3).toBeCloseTo(plain.dryCutBankYd3 - stripping.fromCutYd3, 9)
    expect(balance.compactedNeededYd3).toBeCloseTo(plain.compactedNeededYd3 + stripping.underFillYd3, 9)
  })

  const bank = fc
    .array(fc.integer({ min: -30, max: 30 }), { minLength: 3, maxLength: 12 })
    .map((wiggles) => [
      { stationFt: -400, elevationFt: 101.5 },
      ...wiggles.map((tenths, index) => ({ stationFt: index * 11, elevationFt: 102 - index + tenths / 20 })),
      { stationFt: 400, elevationFt: 60 },
      { stationFt: 900, elevationFt: 40 },
    ])

  it('gives the same prismoidal volumes whatever the interval, since sections stand at every break', () => {
    fc.assert(
      fc.property(bank, fc.integer({ min: 3, max: 90 }), (wild, intervalFt) => {
        const at = rampProfile({ ...profileInput, groundLine: wild, rampTopStationFt: 10 })
        const of = (stationIntervalFt: number) =>
          earthwork({ groundLine: wild, profile: at, stationIntervalFt }).total.prismoidal
        const [coarse, fine] = [of(1000), of(intervalFt)]
        expect(fine.cutYd3).toBeCloseTo(coarse.cutYd3, 6)
        expect(fine.fillYd3).toBeCloseTo(coarse.fillYd3, 6)
        expect(fine.wetCutYd3).toBeCloseTo(coarse.wetCutYd3, 6)
        expect(fine.wetFillYd3).toBeCloseTo(coarse.wetFillYd3, 6)
        expect(fine.edgeBackfillYd3).toBeCloseTo(coarse.edgeBackfillYd3, 6)
      }),
      { numRuns: 60 },
    )
  })

  it('lists sections whose own average end areas are the volume shown, and wet never exceeds all', () => {
    fc.assert(
      fc.property(bank, (wild) => {
        const at = rampProfile({ ...profileInput, groundLine: wild, rampTopStationFt: 10 })
        const measured = earthwork({ groundLine: wild, profile: at })
        const ramp = averageEndAreaYd3({ sections: measured.sections.filter(({ part }) => part === 'ramp') })
        // A crossing's area is zero but for rounding, so the zero-point rule may split what the plain mean does not.
        expect(ramp.cutYd3).toBeCloseTo(measured.averageEndArea.cutYd3, 6)
        expect(ramp.fillYd3).toBeCloseTo(measured.averageEndArea.fillYd3, 6)
        for (const section of measured.sections) {
          expect(section.wetCutAreaFt2).toBeLessThanOrEqual(section.cutAreaFt2 + 1e-9)
          expect(section.wetFillAreaFt2).toBeLessThanOrEqual(section.fillAreaFt2 + 1e-9)
        }
      }),
      { numRuns: 60 },
    )
  })

  it('says which station the survey must reach when it ends before the end cut comes out', () => {
    const short = [...groundLine.slice(0, 9), { stationFt: 100, elevationFt: 94.6 }]
    // Bed falls 0.08 a foot; from 0.4 ft past the toe at 1:3 up.
    expect(() => earthwork({ groundLine: short })).toThrow(
      expect.objectContaining({
        field: 'groundLine',
        message: 'The survey ends at station 100; it must reach at least station 102.358.',
      }),
    )
  })

  it('gives no station when the nose would never meet a bed that falls as fast', () => {
    const cliff = [
      { stationFt: 0, elevationFt: 103 },
      { stationFt: 10, elevationFt: 101.5 },
      { stationFt: 20, elevationFt: 80 },
      { stationFt: 70, elevationFt: 55 },
    ]
    const hanging = rampProfile({ ...profileInput, groundLine: cliff })
    expect(() => earthwork({ groundLine: cliff, profile: hanging })).toThrow(/never meets the earthwork/)
  })

  it.each<[Partial<RampEarthworkInput>, string]>([
    [{ widthFt: 0 }, 'widthFt'],
    [{ widthFt: NaN }, 'widthFt'],
    [{ edgeAllowanceFt: -1 }, 'edgeAllowanceFt'],
    [{ edgeRunPerRise: -1 }, 'edgeRunPerRise'],
    [{ rockThicknessIn: -1 }, 'rockThicknessIn'],
    [{ cutSideRunPerRise: -1 }, 'cutSideRunPerRise'],
    [{ fillSideRunPerRise: Infinity }, 'fillSideRunPerRise'],
    [{ waterSurfaceTodayFt: NaN }, 'waterSurfaceTodayFt'],
    [{ stationIntervalFt: 0 }, 'stationIntervalFt'],
    [{ stationIntervalFt: 0.001 }, 'stationIntervalFt'],
    [{ stripDepthIn: -1 }, 'stripDepthIn'],
    [{ swellPercent: -1 }, 'swellPercent'],
    [{ shrinkPercent: 100 }, 'shrinkPercent'],
    [{ otherDryCutYd3: NaN }, 'otherDryCutYd3'],
    [{ spreadDepthIn: 0 }, 'spreadDepthIn'],
    [{ groundLine: groundLine.slice(0, 1) }, 'groundLine'],
    [{ groundLine: groundLine.slice(0, 8) }, 'groundLine'],
    [{ groundLine: groundLine.slice(5) }, 'groundLine'],
    [{ profile: { surface: [] } }, 'profile'],
  ])('refuses %o', (change, field) => {
    expect(() => earthwork(change)).toThrow(expect.objectContaining({ field }))
  })
})
