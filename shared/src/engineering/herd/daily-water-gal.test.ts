import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type AnimalClass, dailyWaterGal } from './daily-water-gal.js'

const one = (animals: Omit<AnimalClass, 'head'>) => {
  const [water] = dailyWaterGal({ classes: [{ head: 1, ...animals }] }).classes
  if (!water) throw new Error('one class was asked for')
  return water
}
const cow = (weightLb: number, milkLb: number, temperatureF: number) =>
  one({ kind: 'beef-cow', weightLb, milkLb, temperatureF })

describe('dailyWaterGal', () => {
  it.each([
    [1100, 0, [8.2, 10.8, 13.4]],
    [1100, 10, [10.5, 13.1, 15.7]],
    [1100, 25, [12.8, 15.4, 17.9]],
    [1300, 0, [9.2, 11.8, 14.3]],
    [1300, 10, [12.2, 14.8, 17.4]],
    [1300, 25, [14.5, 17.1, 19.7]],
    [1500, 0, [10.2, 12.7, 15.3]],
    [1500, 10, [14.0, 16.5, 19.1]],
    [1500, 25, [16.3, 18.8, 21.4]],
  ])(
    'gives a %d lb cow with %d lb of milk the printed gallons (K-State Beef Tips, 30 April 2018)',
    (lb, milk, row) => {
      expect([40, 65, 90].map((temperature) => cow(lb, milk, temperature).perHeadGal)).toEqual(row)
    },
  )

  it.each<[AnimalClass['kind'], number[]]>([
    ['calf-500', [6.5, 7.4, 10.6]],
    ['growing', [9.3, 10.6, 14]],
    ['finishing', [10.8, 12.3, 16.5]],
    ['bred-heifer', [9, 10.3, 14.6]],
    ['bull', [12.7, 14.6, 19.5]],
  ])('gives %s the printed gallons at 70, 80 and 90 F (Beef Magazine, Watch Summer Water)', (kind, row) => {
    expect([70, 80, 90].map((temperatureF) => one({ kind, temperatureF }).perHeadGal)).toEqual(row)
  })

  it.each<[AnimalClass['kind'], number]>([
    ['dairy-cow', 40],
    ['horse', 12],
    ['sheep', 4],
    ['goat', 4],
  ])('gives %s the planning figure at any temperature (University of Maine, lesson 7)', (kind, gallons) => {
    expect(one({ kind, temperatureF: 30 })).toMatchObject({ perHeadGal: gallons, extrapolated: false })
    expect(one({ kind, temperatureF: 95 })).toMatchObject({ perHeadGal: gallons, extrapolated: false })
  })

  it('gives 75 cows 1,477.5 gal a day and names the row (constructed example, no outside evidence)', () => {
    const water = dailyWaterGal({
      classes: [{ kind: 'beef-cow', head: 75, weightLb: 1300, milkLb: 25, temperatureF: 90 }],
    })
    expect(water.totalGal).toBe(1477.5)
    expect(water.classes[0]?.row).toBe('1,300 lb cow, 25 lb milk, 90 F (K-State 2018)')
    expect(water.classes[0]?.source).toContain('Waggoner')
  })

  it('runs straight between rows in weight, milk and temperature', () => {
    expect(cow(1200, 0, 40).perHeadGal).toBeCloseTo(8.7, 10)
    expect(cow(1100, 5, 40).perHeadGal).toBeCloseTo(9.35, 10)
    expect(cow(1100, 0, 50).perHeadGal).toBeCloseTo(8.2 + 2.6 * 0.4, 10)
  })

  it('holds the coldest row below it and goes on with the slope above the hottest, marked as such', () => {
    expect(cow(1100, 0, -10)).toMatchObject({ perHeadGal: 8.2, extrapolated: false })
    expect(cow(1100, 0, 100).perHeadGal).toBeCloseTo(13.4 + 2.6 * 0.4, 10)
    expect(cow(1100, 0, 100).extrapolated).toBe(true)
    expect(one({ kind: 'bull', temperatureF: 60 })).toMatchObject({ perHeadGal: 12.7, extrapolated: false })
    expect(one({ kind: 'bull', temperatureF: 95 }).perHeadGal).toBeCloseTo(19.5 + 4.9 / 2, 10)
    expect(one({ kind: 'bull', temperatureF: 95 }).extrapolated).toBe(true)
  })

  it('lets the figure typed by the planner hold over the table, and adds the classes up', () => {
    const water = dailyWaterGal({
      classes: [
        { kind: 'beef-cow', head: 10, temperatureF: 90, perHeadGal: 20 },
        { kind: 'other', head: 4, temperatureF: 90, perHeadGal: 2.5 },
      ],
    })
    expect(water.totalGal).toBe(210)
    expect(water.classes.map(({ source }) => source)).toEqual([
      'typed by the planner',
      'typed by the planner',
    ])
  })

  it('never gives a hotter day less water', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1100, max: 1500 }),
        fc.integer({ min: 0, max: 25 }),
        fc.integer({ min: 0, max: 110 }),
        (weightLb, milkLb, temperatureF) => {
          const cooler = cow(weightLb, milkLb, temperatureF).perHeadGal
          expect(cow(weightLb, milkLb, temperatureF + 1).perHeadGal).toBeGreaterThanOrEqual(cooler - 1e-9)
        },
      ),
    )
  })

  const good = { kind: 'beef-cow', head: 1, weightLb: 1300, milkLb: 10, temperatureF: 70 } as const
  it.each<[object, string]>([
    [{ weightLb: undefined }, 'classes[0].weightLb'],
    [{ weightLb: 1600 }, 'classes[0].weightLb'],
    [{ weightLb: 1000 }, 'classes[0].weightLb'],
    [{ milkLb: undefined }, 'classes[0].milkLb'],
    [{ milkLb: 30 }, 'classes[0].milkLb'],
    [{ temperatureF: NaN }, 'classes[0].temperatureF'],
    [{ head: 1.5 }, 'classes[0].head'],
    [{ kind: 'other' }, 'classes[0].perHeadGal'],
    [{ kind: 'llama' }, 'classes[0].kind'],
    [{ perHeadGal: 0 }, 'classes[0].perHeadGal'],
  ])('refuses a class with %o', (change, field) => {
    const classes = [{ ...good, ...change } as AnimalClass]
    expect(() => dailyWaterGal({ classes })).toThrow(expect.objectContaining({ field }))
  })

  it('refuses an empty herd', () => {
    expect(() => dailyWaterGal({ classes: [] })).toThrow(expect.objectContaining({ field: 'classes' }))
  })
})
