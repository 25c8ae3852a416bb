import { describe, expect, it } from 'vitest'
import { costEstimate } from './cost-estimate.js'
import { addMoney } from './money-arithmetic.js'

const line = (key: string, quantity: number, unit: string) => ({
  key,
  practice: '578',
  description: key,
  quantity,
  unit,
})

describe('costEstimate', () => {
  // Kerr Center, Stabilized Stream Crossings, 2011 prices: lines whose printed amount agrees with quantity and rate.
  it('prices the lines of the Kerr Center stream crossing (2011) line by line', () => {
    const rows = [
      ['fabric', 104, 'yd2', '1.20', '124.80'],
      ['gravel', 30, 'ton', '16.67', '500.10'],
      ['dozer', 4, 'hr', '70.00', '280.00'],
      ['tractor', 2, 'hr', '10.00', '20.00'],
      ['labour', 6, 'hr', '10.00', '60.00'],
    ] as const
    const estimate = costEstimate({
      lines: rows.map(([key, quantity, unit]) => line(key, quantity, unit)),
      costList: { lines: rows.map(([key, , , rate]) => ({ key, low: rate, typical: rate, high: rate })) },
    })
    // The page prints 500 for 30 t at 16.67; the product is 500.10, and the total follows the lines shown.
    expect(estimate.lines.map(({ typical }) => typical)).toEqual(rows.map((row) => row[4]))
    expect(estimate.typical).toBe('984.90')
  })

  it('gives low, typical and high, each total the sum of its lines shown', () => {
    const lines = [line('fabric', 33.3333, 'yd2'), line('gravel', 66.6667, 'ton')]
    const prices = { low: '1.0049', typical: '1.5', high: '2.9999' }
    const costList = { lines: lines.map(({ key }) => ({ key, ...prices })) }
    const estimate = costEstimate({ lines, costList })
    for (const level of ['low', 'typical', 'high'] as const) {
      expect(estimate[level]).toBe(addMoney(...estimate.lines.map((priced) => priced[level])))
    }
    expect(estimate.lines.map(({ low, typical, high }) => [low, typical, high])).toEqual([
      ['33.50', '50.00', '100.00'],
      ['66.99', '100.00', '199.99'],
    ])
  })

  it('names the line that the cost list has no price for', () => {
    const costList = { name: 'Spring', lines: [] }
    expect(() => costEstimate({ lines: [line('gate', 1, 'each')], costList })).toThrowError(
      expect.objectContaining({ field: 'costList.gate', message: expect.stringContaining('Spring') }),
    )
  })
})
