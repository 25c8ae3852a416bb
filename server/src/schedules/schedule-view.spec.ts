import { scheduleInputSchema, type Money } from 'shared'
import { PaymentSchedule } from './payment-schedule.entity'
import { ScheduleLineRow } from './schedule-line.entity'
import { scheduleView } from './schedule-view'

const row: PaymentSchedule = Object.assign(new PaymentSchedule(), {
  districtId: 'd',
  id: 's',
  key: 'example-fund',
  name: 'Example fund',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  percent: null,
  higherPercent: null,
  percentOf: null,
  cap: '4500.00' as Money,
  amount: null,
  advancePercent: 0,
  practices: null,
  status: 'draft',
  version: 2,
  createdAt: new Date('2026-05-14T20:04:00Z'),
  inForceAt: null,
  retiredAt: null,
})

const lineRow = (baseRate: string, higherRate: string | null): ScheduleLineRow =>
  Object.assign(new ScheduleLineRow(), {
    districtId: 'd',
    scheduleId: 's',
    position: 0,
    code: 'SB-01',
    practice: '561',
    title: 'Surface stone',
    unit: 'ton',
    baseRate,
    higherRate,
    quantityKey: null,
  })

describe('the view of a schedule', () => {
  it('leaves out what the schedule does not say, keeps what it says as 0, and can be sent back', () => {
    const { id, status, version, ...input } = scheduleView(row, [lineRow('24.0000', null)])
    expect({ id, status, version }).toEqual({ id: 's', status: 'draft', version: 2 })
    expect(Object.keys(input)).not.toContain('percent')
    expect(input).toMatchObject({ cap: '4500.00', advancePercent: 0 })
    expect(scheduleInputSchema.parse(input)).toEqual(input)
  })

  it.each([
    ['24.0000', '24.00'],
    ['0.1000', '0.10'],
    ['1.8550', '1.855'],
    ['1.8505', '1.8505'],
    ['100.0000', '100.00'],
    ['0.0000', '0.00'],
  ])('shows a rate kept as %s as %s', (kept, shown) => {
    const [line] = scheduleView(row, [lineRow(kept, kept)]).lines
    expect([line?.baseRate, line?.higherRate]).toEqual([shown, shown])
  })
})
