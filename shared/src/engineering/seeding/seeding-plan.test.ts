import { describe, expect, it } from 'vitest'
import { seedingPlan, type SeedInput, type SeedingPlanInput } from './seeding-plan.js'

const seed = (rate: number, sharePercent: number, change: Partial<SeedInput> = {}): SeedInput => ({
  species: `at ${rate} lb`,
  pureStandLbPlsPerAcre: rate,
  sharePercent,
  purity: 1,
  germination: 1,
  ...change,
})
const oneAcre: SeedingPlanInput = { disturbedAreaFt2: 43560, mulchTonsPerAcre: 2, mix: [seed(20, 100)] }

describe('seedingPlan', () => {
  it('gives the mix of the Soil Conservation Service, Colorado, seeding specification on one acre', () => {
    const mix = [seed(16, 35), seed(3, 30), seed(11, 20), seed(4.5, 15)]
    const pounds = seedingPlan({ ...oneAcre, mix }).mix.map(({ plsLb }) => plsLb)
    // Printed 5.6, 0.9, 2.2, 0.7 and in all 9.4, each rounded to a tenth.
    const printed = [5.6, 0.9, 2.2, 0.675]
    pounds.forEach((plsLb, index) => expect(plsLb).toBeCloseTo(printed[index] ?? NaN, 10))
    expect(pounds.reduce((sum, plsLb) => sum + plsLb, 0)).toBeCloseTo(9.375, 10)
  })

  it('gives what was worked out apart from this code for one constructed job', () => {
    const mix = [seed(20, 100, { species: 'tall fescue', purity: 0.97, germination: 0.85 })]
    const plan = seedingPlan({ disturbedAreaFt2: 3566.4650509009916, mulchTonsPerAcre: 2, mix })
    expect(plan.acres).toBeCloseTo(0.0818747716001146, 12)
    expect(plan.mix).toEqual([
      {
        species: 'tall fescue',
        plsLb: expect.closeTo(1.6374954320022919, 10),
        bulkLb: expect.closeTo(1.9860466124951994, 10),
      },
    ])
    expect(plan.mulchTons).toBeCloseTo(0.1637495432002292, 12)
  })

  it('needs no seed and no mulch where no ground is disturbed', () => {
    expect(seedingPlan({ ...oneAcre, disturbedAreaFt2: 0 })).toEqual({
      disturbedAreaFt2: 0,
      acres: 0,
      mix: [{ species: 'at 20 lb', plsLb: 0, bulkLb: 0 }],
      mulchTons: 0,
    })
  })

  it('takes three shares of a third, written to two places', () => {
    const mix = [seed(9, 33.33), seed(9, 33.33), seed(9, 33.33)]
    expect(seedingPlan({ ...oneAcre, mix }).mix).toHaveLength(3)
  })

  it.each([
    [{ mix: [] }, 'mix', /at least one species/],
    [{ mix: [seed(9, 60), seed(9, 30)] }, 'mix', /come to 90 %; together they must come to 100 %/],
    [{ mix: [seed(9, 60), seed(9, 60)] }, 'mix', /come to 120 %/],
    [{ mix: [seed(9, 130), seed(9, -30)] }, 'mix[0].sharePercent', /at most 100/],
    [{ mix: [seed(0, 100)] }, 'mix[0].pureStandLbPlsPerAcre', /greater than 0/],
    [{ mix: [seed(9, 100, { purity: 97 })] }, 'mix[0].purity', /at most 1/],
    [{ mix: [seed(9, 100, { germination: 0 })] }, 'mix[0].germination', /greater than 0/],
    [{ disturbedAreaFt2: -1 }, 'disturbedAreaFt2', /at least 0/],
    [{ mulchTonsPerAcre: NaN }, 'mulchTonsPerAcre', /a number/],
  ])('refuses %j', (change, field, message) => {
    expect(() => seedingPlan({ ...oneAcre, ...change })).toThrow(
      expect.objectContaining({ field, message: expect.stringMatching(message) }),
    )
  })
})
