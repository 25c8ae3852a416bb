import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { addMoney } from '../money-arithmetic.js'
import type { FundingSource } from './funding-source.js'
import { fundingStack } from './funding-stack.js'

/** One constructed pond job: key, practice, quantity, amount, the area's average unit cost. No published source. */
const bill = [
  ['excavation-dry', '561', 7.656570237931936, '34.45', '4.00'],
  ['excavation-wet', '561', 14.69904607437575, '132.29', '8.00'],
  ['earth-fill', '561', 4.460094671900151, '22.30', '4.50'],
  ['stone-surface', '561', 34.07699739843486, '1056.39', '29.00'],
  ['stone-base', '561', 29.999157190309642, '854.98', '29.00'],
  ['fabric', '561', 191.66666666666666, '354.58', '1.80'],
  ['fabric-pad', '561', 26.666666666666668, '49.33', '1.80'],
  ['fence-electric', '382', 1184.9640687119286, '2310.68', '1.80'],
  ['closing-panel', '382', 114, '855.00', '6.00'],
  ['gate', '382', 1, '245.00', '230.00'],
  ['energizer-and-grounding', '382', 1, '390.00', '400.00'],
  ['berm', '362', 39.750469689619244, '208.69', '5.00'],
  ['seeding', '342', 0.0818747716001146, '50.76', '600.00'],
] as const

const lines = bill.map(([key, practice, quantity]) => ({ key, practice, quantity }))
const cost = { lines: bill.map(([key, , , amount]) => ({ key, amount })), total: '6564.45' }

const a: FundingSource = {
  key: 'A',
  kind: 'unit-rate',
  lines: [
    { key: 'stone-surface', contractedQuantity: 32, rate: '24.00' },
    { key: 'stone-base', contractedQuantity: 34, rate: '22.00' },
    { key: 'fence-electric', contractedQuantity: 1300, rate: '2.10' },
    { key: 'seeding', contractedQuantity: 0.15, rate: '410.00' },
  ],
  advancePercent: 50,
}
const b: FundingSource = {
  key: 'B',
  kind: 'percent-of-cost',
  percent: 75,
  cap: '4500.00',
  averageUnitCosts: Object.fromEntries(bill.map(([key, , , , average]) => [key, average])),
}
const stack = (
  sources: FundingSource[],
  extra: { stackScope?: 'job' | 'practice'; stackLimitPercent?: number } = {},
) => fundingStack({ lines, cost, sources, stackLimitPercent: 100, ...extra })
const paidBy = ({ sources }: ReturnType<typeof fundingStack>) =>
  Object.fromEntries(sources.map(({ key, paid }) => [key, paid]))

describe('fundingStack on one constructed job (no published source)', () => {
  it('pays the least of designed and contracted quantity at the unit rate, each line rounded once', () => {
    const [source] = stack([a]).sources
    expect(source?.lines.map(({ key, amount }) => [key, amount])).toEqual([
      ['stone-surface', '768.00'],
      ['stone-base', '659.98'],
      ['fence-electric', '2488.42'],
      ['seeding', '33.57'],
    ])
    expect(source?.paid).toBe('3949.97')
  })

  it('rounds half a cent of an advance upward: half of 3949.97 is 1974.99', () => {
    expect(stack([a]).sources[0]?.advance).toBe('1974.99')
  })

  it('cuts a percent of cost by its cap and then by the stack limit, and itemises both', () => {
    const result = stack([a, b])
    expect(result.sources[1]).toMatchObject({
      base: '6089.31',
      offered: '4566.98',
      paid: '2614.48',
      percentOf: 'estimated-cost',
      cuts: [
        { reason: 'source cap $4,500.00', amount: '66.98' },
        { reason: 'stack limit 100 % of estimated cost', amount: '1885.52' },
      ],
    })
    expect(result).toMatchObject({ totalPaid: '6564.45', landownerShare: '0.00' })
  })

  it('gives another split and the same total when the order is turned round', () => {
    expect(paidBy(stack([b, a]))).toEqual({ A: '2064.45', B: '4500.00' })
  })

  it('takes a percent of what earlier sources left when the schedule says so', () => {
    const after: FundingSource = { ...b, percentOf: 'cost-after-earlier-sources' }
    const result = stack([a, after])
    expect(paidBy(result)).toEqual({ A: '3949.97', B: '1960.86' })
    expect(result.landownerShare).toBe('653.62')
  })

  it('holds the limit in every practice when the scope is the practice', () => {
    const result = stack([a, b], { stackScope: 'practice' })
    expect(paidBy(result)).toEqual({ A: '3949.97', B: '2552.67' })
    expect(result.landownerShare).toBe('61.81')
    expect(result.perPractice).toEqual([
      { practice: '561', cost: '2504.32', paid: '2504.32' },
      { practice: '382', cost: '3800.68', paid: '3800.68' },
      { practice: '362', cost: '208.69', paid: '146.88' },
      { practice: '342', cost: '50.76', paid: '50.76' },
    ])
  })
})

describe('fundingStack', () => {
  it('holds a source to what is left of the person limit, after its own cap', () => {
    const [source] = stack([{ ...b, personLimitRemaining: '1000.00' }]).sources
    expect(source?.cuts.map(({ reason }) => reason)).toEqual([
      'source cap $4,500.00',
      'person limit $1,000.00',
    ])
    expect(source?.paid).toBe('1000.00')
  })

  it('pays nothing on a practice that an earlier source of the same exclusive group pays', () => {
    const result = stack([
      { ...a, exclusiveGroup: 'federal' },
      { ...b, cap: undefined, exclusiveGroup: 'federal' },
    ])
    const [, second] = result.sources
    // 75 % of the counted cost of 362, the only practice that A leaves alone.
    expect(second?.paid).toBe('149.06')
    expect(second?.cuts.map(({ reason }) => reason)).toEqual(
      ['561', '382', '342'].map((practice) => `practice ${practice} is already paid by A of the same group`),
    )
  })

  it('leaves sources of different groups alone', () => {
    const result = stack([
      { ...a, exclusiveGroup: 'federal' },
      { ...b, exclusiveGroup: 'state' },
    ])
    expect(paidBy(result)).toEqual({ A: '3949.97', B: '2614.48' })
  })

  it('pays a fixed sum whole, and nothing where no line of the job is eligible', () => {
    const fixed: FundingSource = { key: 'C', kind: 'fixed', amount: '500.00' }
    expect(paidBy(stack([fixed]))).toEqual({ C: '500.00' })
    const [none] = stack([{ ...fixed, practices: ['614'] }]).sources
    expect(none).toMatchObject({
      offered: '500.00',
      paid: '0.00',
      cuts: [{ reason: 'no line of this job is eligible', amount: '500.00' }],
    })
  })

  it('pays only the practices a source is for', () => {
    const [source] = stack([{ ...a, practices: ['382'] }]).sources
    expect(source?.lines.map(({ key }) => key)).toEqual(['fence-electric'])
  })

  it.each([
    [
      'a rate as a number',
      { ...a, lines: [{ key: 'seeding', rate: 410 as unknown as string }] },
      'A.seeding.rate',
    ],
    ['a percent above 100', { ...b, percent: 101 }, 'B.percent'],
    ['a cap below zero', { ...b, cap: '-1.00' }, 'B.cap'],
    ['a fixed source without an amount', { key: 'C', kind: 'fixed' as const }, 'C.amount'],
  ])('refuses %s by field', (_, source, field) => {
    expect(() => stack([source])).toThrowError(expect.objectContaining({ field }))
  })

  it('refuses a fund that is named twice, since it would pay twice and pass its cap', () => {
    const fund: FundingSource = {
      key: 'C',
      name: 'Creek fund',
      kind: 'fixed',
      amount: '900.00',
      cap: '500.00',
    }
    expect(stack([fund]).totalPaid).toBe('500.00')
    expect(() => stack([fund, a, { ...fund, personLimitRemaining: '100.00' }])).toThrowError(
      expect.objectContaining({ field: 'C', message: expect.stringMatching(/^Creek fund is named twice/) }),
    )
  })

  it('refuses a stack limit above 100', () => {
    expect(() => stack([a], { stackLimitPercent: 101 })).toThrowError(
      expect.objectContaining({ field: 'stackLimitPercent' }),
    )
  })
})

const cents = fc.integer({ min: 0, max: 500_000 }).map((value) => (value / 100).toFixed(2))
const practice = fc.constantFrom('561', '382', '362')
const job = fc.array(
  fc.record({ practice, quantity: fc.double({ min: 0, max: 2000, noNaN: true }), amount: cents }),
  {
    minLength: 1,
    maxLength: 8,
  },
)
const anySource = (index: number): fc.Arbitrary<FundingSource> =>
  fc.record({
    key: fc.constant(`S${index}`),
    kind: fc.constantFrom('unit-rate' as const, 'percent-of-cost' as const, 'fixed' as const),
    lines: fc.array(
      fc.record({
        key: fc.integer({ min: 0, max: 7 }).map(String),
        rate: cents,
        contractedQuantity: fc.nat(900),
      }),
      { maxLength: 3 },
    ),
    percent: fc.integer({ min: 0, max: 100 }),
    percentOf: fc.constantFrom('estimated-cost' as const, 'cost-after-earlier-sources' as const),
    amount: cents,
    cap: fc.option(cents, { nil: undefined }),
    personLimitRemaining: fc.option(cents, { nil: undefined }),
    exclusiveGroup: fc.option(fc.constantFrom('g', 'h'), { nil: undefined }),
    practices: fc.option(fc.subarray(['561', '382', '362']), { nil: undefined }),
  })
const anyCase = fc.record({
  job,
  sources: fc.tuple(anySource(1), anySource(2), anySource(3)),
  stackScope: fc.constantFrom('job' as const, 'practice' as const),
  stackLimitPercent: fc.integer({ min: 0, max: 100 }),
})

const cent = (text: string) => BigInt(text.replace('.', ''))
const run = ({
  job: rows,
  sources,
  stackScope,
  stackLimitPercent,
}: typeof anyCase extends fc.Arbitrary<infer T> ? T : never) => {
  const total = addMoney(...rows.map(({ amount }) => amount as ReturnType<typeof addMoney>))
  const result = fundingStack({
    lines: rows.map((row, index) => ({ key: String(index), ...row })),
    cost: { lines: rows.map(({ amount }, index) => ({ key: String(index), amount })), total },
    sources,
    stackScope,
    stackLimitPercent,
  })
  return { result, total }
}

describe('fundingStack, whatever the sources', () => {
  it('never pays above the stack limit, in all or, by practice, in each', () => {
    fc.assert(
      fc.property(anyCase, (given) => {
        const { result, total } = run(given)
        const limit = BigInt(given.stackLimitPercent)
        expect(cent(result.totalPaid) * 100n <= cent(total) * limit).toBe(true)
        if (given.stackScope !== 'practice') return
        for (const part of result.perPractice)
          expect(cent(part.paid) * 100n <= cent(part.cost) * limit).toBe(true)
      }),
    )
  })

  it('accounts for every cent: offered = paid + cuts, paid = sum of lines, cost = paid + landowner', () => {
    fc.assert(
      fc.property(anyCase, (given) => {
        const { result, total } = run(given)
        for (const { offered, paid, cuts, lines: funded } of result.sources) {
          expect(addMoney(paid, ...cuts.map(({ amount }) => amount))).toBe(offered)
          if (paid !== '0.00') expect(addMoney(...funded.map(({ amount }) => amount))).toBe(paid)
        }
        expect(addMoney(...result.sources.map(({ paid }) => paid))).toBe(result.totalPaid)
        expect(addMoney(result.totalPaid, result.landownerShare)).toBe(total)
      }),
    )
  })
})
