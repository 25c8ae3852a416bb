import type { ApprovalLimits, Role } from 'shared'
import { Membership } from '../../src/accounts/membership.entity'
import { Person } from '../../src/accounts/person.entity'
import { makePerson } from '../factories/district-people'
import { openSession } from './open-session'
import type { Member } from './ready-district'
import type { TestApp } from './test-app'

interface MemberToAdd {
  name: string
  roles: Role[]
  limits?: ApprovalLimits
}

/** One more member of a district, signed in. */
export async function addMember(
  app: TestApp,
  districtId: string,
  { name, roles, limits }: MemberToAdd,
): Promise<Member> {
  const { id: personId, email } = await app.inDistrict(districtId, async (tx) => {
    const id = await makePerson(tx, { name, roles, ...(limits ? { approvalLimits: limits } : {}) })
    return tx.manager.findOneByOrFail(Person, { id })
  })
  const { api } = await openSession(app, { personId, districtId })
  return { personId, name, email, api }
}

/** From the next request on the person holds these roles and no others. */
export async function giveRoles(
  app: TestApp,
  districtId: string,
  { personId, roles }: { personId: string; roles: Role[] },
): Promise<void> {
  await app.inDistrict(districtId, ({ manager }) =>
    manager.update(Membership, { districtId, personId }, { roles }),
  )
}
