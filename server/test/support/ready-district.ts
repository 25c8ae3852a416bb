import { randomUUID } from 'node:crypto'
import type { ApprovalLimits, Money, Role } from 'shared'
import { hashPassword } from '../../src/accounts/password-hash'
import { Membership } from '../../src/accounts/membership.entity'
import { Person } from '../../src/accounts/person.entity'
import { CostListsService } from '../../src/districts/cost-lists.service'
import { CriteriaSetsService } from '../../src/districts/criteria-sets.service'
import { publishedCriteriaInput } from '../../src/districts/published-criteria-input'
import { SettingsService } from '../../src/districts/settings.service'
import type { Tx } from '../../src/platform/database/tx'
import { withAccounts } from '../../src/platform/database/unit-of-work'
import { SchedulesService } from '../../src/schedules/schedules.service'
import { makeDistrict } from '../factories/district-people'
import type { ApiClient } from './api-client'
import { readExample } from './example'
import { openSession } from './open-session'
import type { TestApp } from './test-app'

export const testPassword = 'a sentence long enough for a test'

const wideLimits: ApprovalLimits = {
  maximumHead: 5000,
  maximumDrainageAcres: 5000,
  maximumFillHeightFt: 60,
  maximumCost: '500000.00' as Money,
}

export interface Member {
  personId: string
  name: string
  email: string
  /** Signed in. */
  api: ApiClient
}

const staff = {
  planner: { name: 'Ines Varga', roles: ['planner'], limits: null },
  checker: { name: 'Ravi Sund', roles: ['planner'], limits: wideLimits },
  supervisor: { name: 'Tomas Quill', roles: ['supervisor'], limits: null },
  office: { name: 'Ada Fen', roles: ['office'], limits: null },
  administrator: { name: 'Bela Orsini', roles: ['administrator'], limits: null },
} as const satisfies Record<string, { name: string; roles: Role[]; limits: ApprovalLimits | null }>

export type Staff = keyof typeof staff

export interface ReadyDistrict extends Record<Staff, Member> {
  districtId: string
}

/** Hashed once for all: it takes long on purpose. */
let passwordHash: Promise<string> | undefined

/** A district with its people signed in, settings entered, and criteria, costs and schedules in force. */
export async function makeReadyDistrict(app: TestApp, name: string): Promise<ReadyDistrict> {
  const districtId = randomUUID()
  passwordHash ??= hashPassword(testPassword, app.config.secrets.passwordPepper)
  const hash = await passwordHash
  const people = await app.inDistrict(districtId, async (tx) => {
    await makeDistrict(tx, name)
    await putRulesInForce(app, tx)
    return makeStaff(tx, hash)
  })
  const members: Partial<Record<Staff, Member>> = {}
  for (const [role, person] of Object.entries(people)) {
    const { api } = await openSession(app, { personId: person.personId, districtId })
    members[role as Staff] = { ...person, api }
  }
  return { districtId, ...(members as Record<Staff, Member>) }
}

type MadePerson = Omit<Member, 'api'>

async function makeStaff(tx: Tx, passwordHash: string): Promise<Record<Staff, MadePerson>> {
  const made: Partial<Record<Staff, MadePerson>> = {}
  for (const [key, { name, roles, limits }] of Object.entries(staff)) {
    const personId = randomUUID()
    const email = `${key}.${personId.slice(0, 8)}@people.example`
    await withAccounts(tx, async ({ manager, at }) => {
      const person = { id: personId, name, email, passwordHash, isActive: true, createdAt: at }
      await manager.insert(Person, person)
      await manager.insert(Membership, {
        districtId: tx.districtId,
        personId,
        roles: [...roles],
        approvalLimits: limits,
        isActive: true,
        createdAt: at,
      })
    })
    made[key as Staff] = { personId, name, email }
  }
  return made as Record<Staff, MadePerson>
}

async function putRulesInForce({ nest }: TestApp, tx: Tx): Promise<void> {
  const { job } = readExample('north-pond')
  await nest.get(SettingsService, { strict: false }).save(tx, 0, job.settings)
  const criteria = nest.get(CriteriaSetsService, { strict: false })
  await criteria.putInForce(tx, (await criteria.create(tx, publishedCriteriaInput('2026-01-01'))).id)
  const costs = nest.get(CostListsService, { strict: false })
  await costs.putInForce(tx, (await costs.create(tx, job.costList)).id)
  const schedules = nest.get(SchedulesService, { strict: false })
  for (const input of job.schedules) {
    // The funds of the example end with their year; these tests are to hold in any.
    const { id } = await schedules.create(tx, { ...input, effectiveTo: '2126-09-30' })
    await schedules.putInForce(tx, id)
  }
}
