import { Problem, type DesignResult } from 'shared'
import { fundingOffers } from './funding-offers'
import { pointerOf, refuseEmptySettings, refuseIncomplete, refuseUnmapped } from './refuse-unready'
import type { RulesInForce } from './rules-in-force'
import type { ScheduleInForce } from './schedule-in-force'

const schedule: ScheduleInForce = {
  id: '00000000-0000-4000-8000-000000000001',
  key: 'creek-fund',
  name: 'Creek fund',
  fiscalYear: 2026,
  kind: 'unit-rate',
  effectiveFrom: '2025-10-01',
  effectiveTo: '2026-09-30',
  lines: [
    {
      code: 'C-1',
      practice: '561',
      title: 'Stone',
      unit: 'ton',
      baseRate: '20.00',
      quantityKey: 'stone-surface',
    },
    { code: 'C-2', practice: '382', title: 'Fence', unit: 'ft', baseRate: '2.00', quantityKey: null },
  ],
}

const rules: RulesInForce = {
  onDate: '2026-05-14',
  criteriaSet: { id: 'c', name: 'Criteria', criteria: [] },
  costList: { id: 'l', name: 'Costs', lines: [] },
  schedules: [schedule],
  settings: [
    {
      key: 'swellPercent',
      label: 'Swell of excavated earth',
      isNeeded: true,
      value: 25,
      sourceDate: '2026-01-01',
      source: 'board',
    },
  ],
}

function offersFor(contracted: Record<string, number>, given: RulesInForce = rules) {
  const sources = [{ scheduleKey: 'creek-fund', rate: 'base' as const, contracted }]
  return fundingOffers({ inputVersion: 1, funding: { sources } }, given)
}

function problemOf(act: () => void): Problem {
  try {
    act()
  } catch (error) {
    if (error instanceof Problem) return error
  }
  throw new Error('Nothing was refused.')
}

describe('a design that is not ready for a packet', () => {
  it('is refused when a needed setting is empty, naming it and who fills it', () => {
    const [setting] = rules.settings
    const empty = { ...rules, settings: [{ ...setting!, value: null }] }
    const { slug, extras } = problemOf(() => refuseEmptySettings(empty))
    expect(slug).toBe('setting-missing')
    expect(extras.detail).toContain('Swell of excavated earth')
    expect(extras.detail).toContain('administrator fills it under Settings')
    expect(extras.fields?.[0]?.pointer).toBe('/settings/swellPercent')
    expect(() => refuseEmptySettings(rules)).not.toThrow()
  })

  it('is refused when it counts on a quantity that no line of the schedule is mapped to', () => {
    const { slug, extras } = problemOf(() => refuseUnmapped(offersFor({ 'fence-electric': 1300 })))
    expect(slug).toBe('schedule-not-mapped')
    expect(extras.fields).toEqual([
      {
        pointer: '/funding/sources/0/contracted/fence-electric',
        message: expect.stringContaining('Creek fund'),
      },
    ])
    expect(() => refuseUnmapped(offersFor({ 'stone-surface': 40 }))).not.toThrow()
  })

  it('is refused when a unit-rate schedule maps nothing at all', () => {
    const lines = schedule.lines.map((line) => ({ ...line, quantityKey: null }))
    const bare = { ...rules, schedules: [{ ...schedule, lines }] }
    expect(problemOf(() => refuseUnmapped(offersFor({}, bare))).slug).toBe('schedule-not-mapped')
  })

  it('is refused when its fund has no schedule in force on the day', () => {
    const { extras } = problemOf(() => refuseUnmapped(offersFor({}, { ...rules, schedules: [] })))
    expect(extras.detail).toContain('in force on 2026-05-14')
  })

  it('is refused when two lines of a schedule pay for the same quantity', () => {
    const lines = schedule.lines.map((line) => ({ ...line, quantityKey: 'stone-surface' }))
    const twice = { ...rules, schedules: [{ ...schedule, lines }] }
    expect(problemOf(() => refuseUnmapped(offersFor({}, twice))).extras.detail).toContain('Two lines')
  })

  it('is refused with one field for each part that failed, and without those that only wait for it', () => {
    const result = {
      ramp: { ok: true, value: {} },
      profile: { ok: false, field: 'ramp.gradeRunPerRise', message: 'Too steep.' },
      rock: { ok: false, waitingFor: ['profile'] },
      checks: [],
      calculationVersion: '1',
    } as unknown as DesignResult
    expect(problemOf(() => refuseIncomplete(result, rules)).extras.fields).toEqual([
      { pointer: '/ramp/gradeRunPerRise', message: 'Too steep.' },
    ])
  })

  it('is refused while no criteria are in force, since nothing would fail', () => {
    const problem = problemOf(() => refuseIncomplete({} as DesignResult, { ...rules, criteriaSet: null }))
    expect(problem.extras.fields?.[0]?.pointer).toBe('/criteria')
  })

  it('names a field of a list by a JSON pointer (RFC 6901)', () => {
    expect(pointerOf('rock.layers[1].thicknessIn')).toBe('/rock/layers/1/thicknessIn')
  })
})
