import { quantityCatalogue, type ScheduleInput, type ScheduleLine } from 'shared'
import { northPond } from '../../../shared/examples/north-pond-design'
import { remappingProblems } from './remapping-problems'
import { scheduleProblems } from './schedule-problems'
import { isSameUnit } from './unit-spellings'

const line = (change: Partial<ScheduleLine> = {}): ScheduleLine => ({
  code: 'SB-01',
  practice: '561',
  title: 'Surface stone',
  unit: 'ton',
  baseRate: '24.00',
  quantityKey: 'stone-surface',
  ...change,
})

const schedule = (change: Partial<ScheduleInput> = {}): ScheduleInput => ({
  key: 'example-fund',
  name: 'Example fund',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  lines: [line()],
  ...change,
})

const pointersOf = (change: Partial<ScheduleInput>): string[] =>
  scheduleProblems(schedule(change)).map(({ pointer }) => pointer)

const messageOf = (change: Partial<ScheduleInput>): string | undefined =>
  scheduleProblems(schedule(change))[0]?.message

describe('a payment schedule', () => {
  it('like those of the north pond is taken', () => {
    expect(northPond.schedules.flatMap(scheduleProblems)).toEqual([])
  })

  it('that pays by the unit needs a line, and has no percent and no amount', () => {
    expect(pointersOf({ lines: [] })).toEqual(['/lines'])
    expect(pointersOf({ percent: 75, higherPercent: 90, percentOf: 'estimated-cost' })).toEqual([
      '/percent',
      '/higherPercent',
      '/percentOf',
    ])
  })

  it('that pays a percent says how much and of what, and needs no line', () => {
    const percent: Partial<ScheduleInput> = { kind: 'percent-of-cost', lines: [] }
    expect(pointersOf(percent)).toEqual(['/percent', '/percentOf'])
    expect(pointersOf({ ...percent, percent: 75, percentOf: 'estimated-cost' })).toEqual([])
  })

  it('that pays a fixed amount says which', () => {
    expect(pointersOf({ kind: 'fixed', lines: [] })).toEqual(['/amount'])
  })

  it('has a higher percent and higher rates that are not lower', () => {
    const percent = { kind: 'percent-of-cost', percent: 75, percentOf: 'estimated-cost' } as const
    expect(pointersOf({ ...percent, higherPercent: 60 })).toEqual(['/higherPercent'])
    expect(pointersOf({ lines: [line({ baseRate: '9.00', higherRate: '10.80' })] })).toEqual([])
    expect(pointersOf({ lines: [line({ higherRate: '9.00' })] })).toEqual(['/lines/0/higherRate'])
  })

  it('may last one day and no less', () => {
    expect(pointersOf({ effectiveTo: '2025-10-01' })).toEqual([])
    expect(messageOf({ effectiveTo: '2025-09-30' })).toBe(
      'It ends on 30 September 2025, before it begins on 1 October 2025. Give that day or a later one.',
    )
  })

  it('has every code once, and says which lines share one', () => {
    const lines = [line(), line({ code: 'SB-02', quantityKey: null }), line({ quantityKey: null })]
    expect(scheduleProblems(schedule({ lines }))).toEqual([
      { pointer: '/lines/2/code', message: 'Lines 1 and 3 both have the code SB-01.' },
    ])
  })

  it('pays only for what a design counts', () => {
    expect(messageOf({ lines: [line({ quantityKey: 'gravel' })] })).toMatch(/"gravel".*stone-base/)
    expect(pointersOf({ lines: [line({ quantityKey: 'constructor' })] })).toEqual(['/lines/0/quantityKey'])
  })

  it('pays for no quantity twice', () => {
    const lines = [line(), line({ code: 'SB-02' })]
    expect(messageOf({ lines })).toBe(
      'Line SB-02 pays for stone-surface, and so does line SB-01. Map only one of them.',
    )
  })

  it('pays by the unit in which the quantity is counted, however it is spelled', () => {
    const berm = (unit: string) => ({ lines: [line({ unit, quantityKey: 'berm' })] })
    for (const unit of ['yd3', 'CuYd', 'Cu. Yd.', 'cubic yards']) expect(pointersOf(berm(unit))).toEqual([])
    expect(messageOf(berm('CuFt'))).toMatch(/pays by "CuFt".*counted by yd³.*leave the line unmapped/)
    expect(pointersOf({ lines: [line({ unit: 'CuFt', quantityKey: null })] })).toEqual([])
  })

  it('knows the units of all quantities as we print them', () => {
    for (const { unit } of Object.values(quantityCatalogue)) {
      expect(isSameUnit(unit, unit)).toBe(true)
      expect(isSameUnit(`${unit} a year`, unit)).toBe(false)
    }
  })
})

describe('mapping some lines anew', () => {
  const lines = [
    line(),
    line({ code: 'SB-02', quantityKey: null }),
    line({ code: 'SB-03', quantityKey: null }),
  ]

  it('holds them against the lines that stay', () => {
    const problems = remappingProblems(lines, [{ code: 'SB-02', quantityKey: 'stone-surface' }])
    expect(problems).toEqual([
      { pointer: '/mapping/0/quantityKey', message: expect.stringContaining('so does line SB-01') },
    ])
  })

  it('lets two lines change places', () => {
    const swapped = [
      { code: 'SB-02', quantityKey: 'stone-surface' },
      { code: 'SB-01', quantityKey: null },
    ]
    expect(remappingProblems(lines, swapped)).toEqual([])
  })

  it('refuses a line that is not there, and one mapped twice', () => {
    const mapping = ['SB-09', 'SB-02', 'SB-02'].map((code) => ({ code, quantityKey: null }))
    expect(remappingProblems(lines, mapping).map(({ pointer }) => pointer)).toEqual([
      '/mapping/0/code',
      '/mapping/2/code',
    ])
  })
})
