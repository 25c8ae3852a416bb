import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { workedPlan } from '../../../test/worked-example.js'
import { daysOfSupply, type DaysOfSupplyInput } from './days-of-supply.js'

const stages = workedPlan.pond?.stages ?? []
const worked: DaysOfSupplyInput = {
  stages,
  fromElevationFt: 100,
  toElevationFt: 96,
  dailyWaterGal: 1477.5,
  evaporationInPerDay: 0.25,
  seepageInPerDay: 0.125,
}
const box = [
  { elevationFt: 0, areaFt2: 1200 },
  { elevationFt: 10, areaFt2: 1200 },
]

describe('daysOfSupply', () => {
  it('gives what was worked out apart from this code for one constructed pond', () => {
    const supply = daysOfSupply(worked)
    expect(supply.usePerDayFt3).toBeCloseTo(197.51300711715228, 9)
    expect(supply.usableFt3).toBe(222200)
    expect(supply.days).toBeCloseTo(114.83696254333591, 9)
  })

  it('empties a straight-sided pond in depth over loss when nothing drinks', () => {
    const dry = { stages: box, fromElevationFt: 10, toElevationFt: 4, dailyWaterGal: 0 }
    // 6 ft at half an inch a day.
    expect(daysOfSupply({ ...dry, evaporationInPerDay: 0.3, seepageInPerDay: 0.2 }).days).toBeCloseTo(144, 10)
  })

  it('lasts volume over use when nothing is lost', () => {
    const still = { stages: box, fromElevationFt: 10, toElevationFt: 0 }
    // 231 in³ are a gallon, so 1,728 gallons are 231 ft³; the factor is printed to six digits.
    const { days } = daysOfSupply({
      ...still,
      dailyWaterGal: 1728,
      evaporationInPerDay: 0,
      seepageInPerDay: 0,
    })
    expect(days).toBeCloseTo(12000 / 231, 4)
  })

  it('starts and ends between two stages on the straight line between their areas', () => {
    const { steps } = daysOfSupply({ ...worked, fromElevationFt: 98.6, toElevationFt: 96.5 })
    expect(steps.map(({ fromElevationFt, toElevationFt }) => [fromElevationFt, toElevationFt])).toEqual([
      [98.6, 98],
      [98, 97],
      [97, 96.5],
    ])
    // (58,160 + 55,400)/2 · 0.6, 53,200 and (51,000 + 48,900)/2 · 0.5.
    expect(steps.map(({ storageFt3 }) => Math.round(storageFt3))).toEqual([34068, 53200, 24975])
  })

  it('has no days when the water already stands at or below the lower level', () => {
    expect(daysOfSupply({ ...worked, fromElevationFt: 96 })).toMatchObject({
      days: 0,
      usableFt3: 0,
      steps: [],
    })
    expect(daysOfSupply({ ...worked, fromElevationFt: 90 }).days).toBe(0)
  })

  it('passes a dry step at the bottom in no time', () => {
    const dry = [{ elevationFt: -1, areaFt2: 0 }, { elevationFt: 0, areaFt2: 0 }, ...box.slice(1)]
    const { days } = daysOfSupply({
      stages: dry,
      fromElevationFt: 10,
      toElevationFt: -1,
      dailyWaterGal: 0,
      evaporationInPerDay: 12,
      seepageInPerDay: 0,
    })
    expect(days).toBeCloseTo(10, 10)
  })

  it('lasts in a straight-sided pond as long whether its fall is taken whole or in two', () => {
    const lasts = (fromElevationFt: number, toElevationFt: number) =>
      daysOfSupply({ ...worked, stages: box, fromElevationFt, toElevationFt }).days
    fc.assert(
      fc.property(fc.double({ min: 2, max: 10, noNaN: true }), (between) => {
        expect(lasts(10, between) + lasts(between, 2)).toBeCloseTo(lasts(10, 2), 8)
      }),
    )
  })

  it('never lasts longer when more is drunk', () => {
    const more = fc.double({ min: 0, max: 10000, noNaN: true })
    fc.assert(
      fc.property(more, more, (a, b) => {
        const lasts = (dailyWaterGal: number) => daysOfSupply({ ...worked, dailyWaterGal }).days
        expect(lasts(Math.max(a, b))).toBeLessThanOrEqual(lasts(Math.min(a, b)))
      }),
    )
  })

  it.each([
    [{ fromElevationFt: 101 }, 'stages', /from 96 to 100 ft; they must reach from 96 to 101 ft/],
    [{ toElevationFt: 95.5 }, 'stages', /they must reach from 95.5 to 100 ft/],
    [{ dailyWaterGal: -1 }, 'dailyWaterGal', /at least 0/],
    [{ evaporationInPerDay: NaN }, 'evaporationInPerDay', /a number/],
    [{ seepageInPerDay: -0.1 }, 'seepageInPerDay', /at least 0/],
    [{ dailyWaterGal: 0, evaporationInPerDay: 0, seepageInPerDay: 0 }, 'dailyWaterGal', /for ever/],
    [{ stages: [] }, 'stages', /two levels/],
  ])('refuses %j', (change, field, message) => {
    expect(() => daysOfSupply({ ...worked, ...change })).toThrow(
      expect.objectContaining({ field, message: expect.stringMatching(message) }),
    )
  })
})
