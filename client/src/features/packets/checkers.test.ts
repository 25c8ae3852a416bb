import type { PersonView } from 'shared'
import { describe, expect, it } from 'vitest'
import { checkersOf } from './checkers'

const person = (id: string, name: string, rest: Partial<PersonView> = {}): PersonView => ({
  id,
  name,
  email: `${id}@example.org`,
  roles: ['planner'],
  approvalLimits: null,
  isActive: true,
  ...rest,
})

describe('who may check a packet', () => {
  it('are people who plan or supervise, and nobody who has left', () => {
    const people = [
      person('a', 'Ana'),
      person('b', 'Ben', { roles: ['supervisor'] }),
      person('c', 'Cal', { roles: ['office'] }),
      person('d', 'Dot', { isActive: false }),
    ]
    expect(checkersOf(people, null).map(({ name }) => name)).toEqual(['Ana', 'Ben'])
  })

  it('mark the designer, but never a namesake', () => {
    const people = [person('a', 'Ana'), person('b', 'Ben')]
    expect(checkersOf(people, 'Ana').map(({ isDesigner }) => isDesigner)).toEqual([true, false])
    const twice = [...people, person('e', 'Ana')]
    expect(checkersOf(twice, 'Ana').every(({ isDesigner }) => !isDesigner)).toBe(true)
  })
})
