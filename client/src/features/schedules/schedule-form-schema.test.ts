import { describe, expect, it } from 'vitest'
import { scheduleFormSchema } from './schedule-form-schema'

const typed = {
  key: 'basin-fund',
  name: 'Basin fund',
  fiscalYear: 2026,
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  percent: 60,
  amount: '800.00',
  lines: [
    { code: 'B-1', practice: '561', title: 'Stone', unit: 'ton', baseRate: '21.50', quantityKey: null },
  ],
}

describe('a new schedule', () => {
  it('does not send what was typed for another kind of fund', () => {
    const fixed = scheduleFormSchema.parse({ ...typed, kind: 'fixed' })
    expect(fixed).not.toHaveProperty('percent')
    expect(fixed).toMatchObject({ amount: '800.00', lines: [] })
    const percent = scheduleFormSchema.parse({ ...typed, kind: 'percent-of-cost' })
    expect(percent).not.toHaveProperty('amount')
    expect(percent.lines).toHaveLength(1)
  })

  it('says of a missing figure what would be right', () => {
    const read = scheduleFormSchema.safeParse({ ...typed, kind: 'fixed', fiscalYear: undefined as never })
    expect(read.error?.issues).toMatchObject([{ path: ['fiscalYear'], message: 'Give a number' }])
  })
})
