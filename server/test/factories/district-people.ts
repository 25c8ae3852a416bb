import { randomUUID } from 'node:crypto'
import type { ApprovalLimits, Role } from 'shared'
import { Membership } from '../../src/accounts/membership.entity'
import { Person } from '../../src/accounts/person.entity'
import { District } from '../../src/districts/district.entity'
import type { Tx } from '../../src/platform/database/tx'
import { withAccounts } from '../../src/platform/database/unit-of-work'

/** An invented district with nobody in it. The transaction must be one of this very district. */
export async function makeDistrict(tx: Tx, name: string): Promise<void> {
  await withAccounts(tx, ({ manager }) =>
    manager.insert(District, {
      id: tx.districtId,
      name,
      timeZone: 'America/Chicago',
      fiscalYearStartMonth: 10,
      jobNumberPrefix: 'T',
      checkerMayApprove: false,
      isDemo: true,
      createdAt: tx.at,
    }),
  )
}

interface PersonToMake {
  name: string
  roles: Role[]
  approvalLimits?: ApprovalLimits
}

export async function makePerson(tx: Tx, { name, roles, approvalLimits }: PersonToMake): Promise<string> {
  const id = randomUUID()
  const email = `${name.toLowerCase().replace(/\W+/g, '.')}.${id.slice(0, 8)}@people.example`
  await withAccounts(tx, async ({ manager }) => {
    await manager.insert(Person, {
      id,
      name,
      email,
      passwordHash: null,
      isActive: true,
      createdAt: tx.at,
    })
    await manager.insert(Membership, {
      districtId: tx.districtId,
      personId: id,
      roles,
      approvalLimits: approvalLimits ?? null,
      isActive: true,
      createdAt: tx.at,
    })
  })
  return id
}
