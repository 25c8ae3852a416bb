import { describe, expect, it } from 'vitest'
import { earthBalance } from './earth-balance.js'

const noStripping = { strippedYd3: 0, fromCutYd3: 0, underFillYd3: 0 }
const volumes = {
  cutYd3: 17.91117186786324,
  fillYd3: 2.101830442020544,
  wetCutYd3: 14.69904607437575,
  dryCutYd3: 3.212125793487491,
  wetFillYd3: 0.702256110712717,
  edgeBackfillYd3: 2.3582642298796075,
}
const only = (change: Partial<typeof volumes>) => ({
  cutYd3: 0,
  fillYd3: 0,
  wetCutYd3: 0,
  dryCutYd3: 0,
  wetFillYd3: 0,
  edgeBackfillYd3: 0,
  ...change,
})

describe('earthBalance', () => {
  it.each(
    Object.entries({
      dryCutBankYd3: 7.656570237931936,
      wetCutBankYd3: 14.69904607437575,
      compactedNeededYd3: 4.460094671900151,
      bankNeededYd3: 4.955660746555724,
      borrowBankYd3: 0,
      dryCutLeftBankYd3: 2.700909491376212,
      coarseFillYd3: 0.702256110712717,
      spoilLooseYd3: 18.373807592969687,
      spoilSpreadAreaFt2: 992.1856100203631,
    }),
  )('gives %s as %d (constructed example, no outside evidence)', (name, figure) => {
    const settings = {
      swellPercent: 25,
      shrinkPercent: 10,
      otherDryCutYd3: 4.444444444444445,
      spreadDepthIn: 6,
    }
    const balance = earthBalance({ volumes, stripping: noStripping, ...settings })
    expect(new Map<string, unknown>(Object.entries(balance)).get(name)).toBeCloseTo(figure, 8)
  })

  it('swells 100 bank yd3 to 125 loose at 25 percent (published trade example)', () => {
    const balance = earthBalance({
      volumes: only({ wetCutYd3: 100 }),
      stripping: noStripping,
      swellPercent: 25,
    })
    expect(balance.spoilLooseYd3).toBeCloseTo(125, 10)
  })

  it('needs about 114 bank yd3 for 100 compacted at 12 percent shrink (published trade example)', () => {
    const balance = earthBalance({
      volumes: only({ fillYd3: 100 }),
      stripping: noStripping,
      shrinkPercent: 12,
    })
    expect(balance.bankNeededYd3).toBeCloseTo(113.6, 1)
    expect(balance.borrowBankYd3).toBe(balance.bankNeededYd3)
  })

  it('never fills with wet cut', () => {
    const balance = earthBalance({
      volumes: only({ fillYd3: 10, wetCutYd3: 50, cutYd3: 50 }),
      stripping: noStripping,
    })
    expect(balance).toMatchObject({ borrowBankYd3: 10, spoilBankYd3: 50, dryCutLeftBankYd3: 0 })
    expect(balance).not.toHaveProperty('spoilSpreadAreaFt2')
  })
})
