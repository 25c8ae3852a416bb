import { describe, expect, it } from 'vitest'
import { can, permissions, reachOf, type Permission } from './permissions.js'
import { roles, type Actor, type Role } from './roles.js'

const person = (...held: Role[]): Actor => ({ personId: 'me', districtId: 'here', roles: held })
const names = Object.keys(permissions) as Permission[]

describe('permissions', () => {
  it('refuse everything in another district, whatever the roles', () => {
    for (const name of names) {
      expect(can(person(...roles), name, { districtId: 'elsewhere', ownerIds: ['me'] })).toBe(false)
    }
  })

  it('refuse everything to a person without a role', () => {
    for (const name of names)
      expect(can(person(), name, { districtId: 'here', ownerIds: ['me'] })).toBe(false)
  })

  it('let a landowner reach only jobs of their own', () => {
    expect(can(person('landowner'), 'packet:read', { districtId: 'here', ownerIds: ['me'] })).toBe(true)
    expect(can(person('landowner'), 'packet:read', { districtId: 'here', ownerIds: ['neighbour'] })).toBe(
      false,
    )
    expect(can(person('landowner'), 'packet:read', { districtId: 'here' })).toBe(false)
  })

  it('never let a landowner list jobs, read a bare design or write one', () => {
    for (const name of ['job:list', 'design:read', 'design:write', 'schedule:read'] as const) {
      expect(reachOf(person('landowner'), name)).toBeNull()
    }
  })

  it('take the widest reach of several roles', () => {
    expect(reachOf(person('landowner', 'planner'), 'job:read')).toBe('district')
  })

  it('keep settings, criteria and people with the administrator', () => {
    for (const name of ['settings:write', 'criteria:write', 'people:write'] as const) {
      expect(roles.filter((role) => reachOf(person(role), name) !== null)).toEqual(['administrator'])
    }
  })
})
