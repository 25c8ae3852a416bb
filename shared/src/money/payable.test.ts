import { describe, expect, it } from 'vitest'
import { payable } from './payable.js'
import type { PayableInput } from './payable-types.js'

const unitRate: PayableInput = {
  source: { kind: 'unit-rate' },
  lines: [
    { key: 'stone-surface', scheduled: 32, designed: 34.077, built: 31.4, rate: '24.00' },
    { key: 'stone-base', scheduled: 34, designed: 29.9992, built: 31.2, rate: '22.00' },
    { key: 'fence-electric', scheduled: 1300, designed: 1184.9641, built: 1288, rate: '2.10' },
    { key: 'seeding', scheduled: 0.15, designed: 0.08187, built: 0.15, rate: '410.00' },
  ],
  paidAtSigning: '3949.97',
  advances: ['1974.99'],
  partials: ['1000.00'],
  final: true,
}
const percent: PayableInput = {
  source: { kind: 'percent-of-cost', percent: 75, baseAtSigning: '6000.00' },
  lines: [],
  documentedCost: '5000.00',
  paidAtSigning: '4500.00',
  advances: [],
  partials: [],
  final: true,
}

describe('payable', () => {
  it('pays the least of scheduled, designed and built (constructed job, no published source)', () => {
    const result = payable(unitRate)
    expect(result.lines.map(({ governs, amount }) => [governs, amount])).toEqual([
      ['built', '753.60'],
      ['designed', '659.98'],
      ['designed', '2488.42'],
      ['designed', '33.57'],
    ])
    expect(result).toMatchObject({ earned: '3935.57', payableNow: '960.58', refundDue: '0.00' })
  })

  it('turns what was paid too much into a refund, never into a payment below 0', () => {
    const result = payable({ ...unitRate, partials: ['1000.00', '1000.00'] })
    expect(result).toMatchObject({ payableNow: '0.00', refundDue: '39.42' })
    expect(result.reasons).toContain('More has been paid than was earned.')
  })

  it('pays a percent of the documented cost, and of no more than the base at signing', () => {
    expect(payable(percent).payableNow).toBe('3750.00')
    expect(payable({ ...percent, documentedCost: '9000.00' }).payableNow).toBe('4500.00')
  })

  it('asks for the documented cost of a percent', () => {
    expect(() => payable({ ...percent, documentedCost: undefined })).toThrowError(
      expect.objectContaining({ field: 'documentedCost' }),
    )
  })

  it.each([
    ['paidAtSigning', 'Held to what was agreed at signing, 100.00.'],
    ['capLeft', 'Held to what is left of the source cap, 100.00.'],
    ['personLimitLeft', 'Held to what is left of the person limit, 100.00.'],
    ['stackRoom', 'Held to what the stack limit leaves at the documented cost, 100.00.'],
  ])('is held to %s and says so', (limit, reason) => {
    const result = payable({ ...percent, [limit]: '100.00' })
    expect(result.payableNow).toBe('100.00')
    expect(result.reasons).toContain(reason)
  })

  it('holds back a percent until the final payment', () => {
    const part = { ...percent, holdBackPercent: 30, final: false }
    expect(payable(part)).toMatchObject({ holdBack: '1125.00', payableNow: '2625.00' })
    expect(payable({ ...part, final: true })).toMatchObject({ holdBack: '0.00', payableNow: '3750.00' })
  })

  it('pays a fixed sum as it stands', () => {
    const fixed = payable({ ...percent, source: { kind: 'fixed', amount: '800.00' } })
    expect(fixed.payableNow).toBe('800.00')
  })

  it('refuses a quantity below 0', () => {
    const lines = [{ key: 'gate', scheduled: 1, designed: 1, built: -1, rate: '1.00' }]
    expect(() => payable({ ...unitRate, lines })).toThrowError(
      expect.objectContaining({ field: 'gate.built' }),
    )
  })
})
