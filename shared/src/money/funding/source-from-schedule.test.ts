import { describe, expect, it } from 'vitest'
import type { ScheduleInput } from '../../schemas/schedule.js'
import { sourceFromSchedule } from './source-from-schedule.js'

const line = {
  code: '1',
  practice: '561',
  title: 'Stone',
  unit: 'ton',
  baseRate: '20.00',
  higherRate: '24.00',
}
const schedule: ScheduleInput = {
  key: 'example-fund',
  name: 'Example fund',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  lines: [
    { ...line, quantityKey: 'stone-surface' },
    { ...line, code: '2', higherRate: undefined, quantityKey: 'stone-base' },
    { ...line, code: '3', quantityKey: null },
  ],
}
const choose = (rate: 'base' | 'higher', contracted?: Record<string, number>) => ({
  scheduleKey: 'example-fund',
  rate,
  ...(contracted ? { contracted } : {}),
})

describe('sourceFromSchedule', () => {
  it('takes the mapped lines only, at the base rate', () => {
    expect(sourceFromSchedule({ schedule, choice: choose('base') }).lines).toEqual([
      { key: 'stone-surface', rate: '20.00' },
      { key: 'stone-base', rate: '20.00' },
    ])
  })

  it('takes the higher rate where the line has one, and the contracted quantity', () => {
    const { lines } = sourceFromSchedule({ schedule, choice: choose('higher', { 'stone-surface': 32 }) })
    expect(lines).toEqual([
      { key: 'stone-surface', rate: '24.00', contractedQuantity: 32 },
      { key: 'stone-base', rate: '20.00' },
    ])
  })

  it('makes a percent of cost with the average costs of its lines and the higher percent', () => {
    const percent: ScheduleInput = {
      ...schedule,
      kind: 'percent-of-cost',
      percent: 75,
      higherPercent: 90,
      cap: undefined,
    }
    expect(sourceFromSchedule({ schedule: percent, choice: choose('higher') })).toEqual({
      key: 'example-fund',
      name: 'Example fund',
      kind: 'percent-of-cost',
      percent: 90,
      averageUnitCosts: { 'stone-surface': '20.00', 'stone-base': '20.00' },
    })
  })

  it('refuses a schedule that pays one line of quantities twice', () => {
    const twice = {
      ...schedule,
      lines: [...schedule.lines, { ...line, code: '4', quantityKey: 'stone-base' }],
    }
    expect(() => sourceFromSchedule({ schedule: twice, choice: choose('base') })).toThrow('stone-base')
  })
})
