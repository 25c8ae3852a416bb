import { Problem } from 'shared'
import { requireEffective, requireDraft } from './versioned-row'

function problemOf(work: () => void): Problem {
  try {
    work()
  } catch (error) {
    if (error instanceof Problem) return error
    throw error
  }
  throw new Error('Nothing was refused.')
}

const list = { name: 'Prices 2026', effectiveFrom: '2026-05-01' }

describe('a list or set', () => {
  it('comes in force from its first day on, and not a day earlier', () => {
    expect(() => requireEffective(list, '2026-05-01', 'cost list')).not.toThrow()
    const { slug, extras } = problemOf(() => requireEffective(list, '2026-04-30', 'cost list'))
    expect(slug).toBe('invalid-fields')
    expect(extras.fields?.[0]).toEqual({
      pointer: '/effectiveFrom',
      message: 'Prices 2026 takes effect on 1 May 2026. Put it in force on that day or later.',
    })
  })

  it('comes in force until its last day, and not a day later', () => {
    const schedule = { ...list, effectiveTo: '2026-09-30' }
    expect(() => requireEffective(schedule, '2026-09-30', 'payment schedule')).not.toThrow()
    const { extras } = problemOf(() => requireEffective(schedule, '2026-10-01', 'payment schedule'))
    expect(extras.fields?.[0]?.pointer).toBe('/effectiveTo')
    expect(extras.detail).toContain('ended on 30 September 2026')
  })

  it('changes only while it is a draft', () => {
    expect(() => requireDraft({ name: 'Prices', status: 'draft' }, 'cost list')).not.toThrow()
    for (const status of ['in-force', 'retired'] as const) {
      const { slug, extras } = problemOf(() => requireDraft({ name: 'Prices', status }, 'cost list'))
      expect(slug).toBe('already-in-use')
      expect(extras.detail).toContain('Make a new cost list')
    }
  })
})
