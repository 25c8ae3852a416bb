import type { Actor, Role } from './roles.js'

type Reach = 'own' | 'district'

/**
 * What each role may do, and how far. `own` means jobs of which the person is a producer;
 * `district` means all of the district of the session.
 */
export const permissions = {
  'job:read': { planner: 'district', landowner: 'own', supervisor: 'district', office: 'district' },
  'job:list': { planner: 'district', supervisor: 'district', office: 'district' },
  'job:create': { planner: 'district' },
  'job:act': { planner: 'district', landowner: 'own', supervisor: 'district', office: 'district' },
  'survey:write': { planner: 'district' },
  'design:read': { planner: 'district', supervisor: 'district', office: 'district' },
  'design:write': { planner: 'district' },
  'packet:read': { planner: 'district', landowner: 'own', supervisor: 'district', office: 'district' },
  'packet:make': { planner: 'district' },
  'packet:make-again': { planner: 'district', office: 'district' },
  'packet:check': { planner: 'district', supervisor: 'district' },
  'packet:sign': { landowner: 'own' },
  'note:read': { planner: 'district', landowner: 'own', supervisor: 'district', office: 'district' },
  'note:write': { planner: 'district', landowner: 'own', supervisor: 'district' },
  'note:answer': { planner: 'district' },
  'mail:read': { planner: 'district', office: 'district' },
  'mail:send-again': { planner: 'district', office: 'district' },
  'producer:read': { planner: 'district', supervisor: 'district', office: 'district' },
  'producer:write': { planner: 'district', office: 'district' },
  'schedule:read': {
    planner: 'district',
    supervisor: 'district',
    office: 'district',
    administrator: 'district',
  },
  'schedule:write': { office: 'district', administrator: 'district' },
  'settings:read': {
    planner: 'district',
    supervisor: 'district',
    office: 'district',
    administrator: 'district',
  },
  'settings:write': { administrator: 'district' },
  'criteria:read': {
    planner: 'district',
    supervisor: 'district',
    office: 'district',
    administrator: 'district',
  },
  'criteria:write': { administrator: 'district' },
  'people:read': {
    planner: 'district',
    supervisor: 'district',
    office: 'district',
    administrator: 'district',
  },
  'people:write': { administrator: 'district' },
} as const satisfies Record<string, Partial<Record<Role, Reach>>>

export type Permission = keyof typeof permissions

export interface Resource {
  readonly districtId: string
  /** Producers of the job the resource belongs to. */
  readonly ownerIds?: readonly string[]
}

/** How far a person may go with a permission: the widest reach of all roles held, or null. */
export function reachOf(actor: Actor, permission: Permission): Reach | null {
  const byRole: Partial<Record<Role, Reach>> = permissions[permission]
  const reaches = actor.roles.map((role) => byRole[role]).filter((reach) => reach !== undefined)
  if (reaches.includes('district')) return 'district'
  return reaches.includes('own') ? 'own' : null
}

/** May this person do this with this resource? */
export function can(actor: Actor, permission: Permission, resource: Resource): boolean {
  if (actor.districtId !== resource.districtId) return false
  const reach = reachOf(actor, permission)
  return reach === 'district' || (reach === 'own' && (resource.ownerIds ?? []).includes(actor.personId))
}
