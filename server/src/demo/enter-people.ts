import { randomUUID } from 'node:crypto'
import { Membership } from '../accounts/membership.entity.js'
import { Person } from '../accounts/person.entity.js'
import { District } from '../districts/district.entity.js'
import type { AccountsTx } from '../platform/database/tx.js'
import type { UnitOfWork } from '../platform/database/unit-of-work.js'
import type { DemoDistrict, DemoPerson } from './demo-district.js'
import { readablePassword } from './readable-password.js'
import { hasSignIns, writeSignIns } from './sign-ins-file.js'

export interface PeopleToEnter {
  work: UnitOfWork
  districts: readonly DemoDistrict[]
  runFolder: string
  hashPassword: (password: string) => Promise<string>
}

interface NewSignIn {
  district: DemoDistrict
  person: DemoPerson
  password: string
  passwordHash: string
}

/**
 * Districts and their people, in one transaction. The passwords are on disk before the database knows them, so that
 * nobody is left with one that was never written down; where the file was lost everybody gets a new one.
 */
export async function enterPeople({
  work,
  districts,
  runFolder,
  hashPassword,
}: PeopleToEnter): Promise<void> {
  const isEntered = await work.runForAccounts((tx) => haveAll(tx, districts))
  if (isEntered && hasSignIns(runFolder)) return
  const made: NewSignIn[] = []
  for (const district of districts) {
    for (const person of district.people) {
      const password = readablePassword()
      made.push({ district, person, password, passwordHash: await hashPassword(password) })
    }
  }
  const signIns = made.map(({ district, person: { role, name, email }, password }) => {
    return { district: district.name, role, name, email, password }
  })
  writeSignIns(runFolder, signIns)
  await work.runForAccounts(async (tx) => {
    for (const signIn of made) await enterPerson(tx, signIn)
  })
}

async function haveAll({ manager }: AccountsTx, districts: readonly DemoDistrict[]): Promise<boolean> {
  for (const { name } of districts) {
    if (!(await manager.existsBy(District, { name, isDemo: true }))) return false
  }
  return true
}

async function enterPerson(tx: AccountsTx, { district, person, passwordHash }: NewSignIn): Promise<void> {
  const districtId = await districtIdOf(tx, district)
  const { name, email, role, approvalLimits } = person
  const known = await tx.manager.findOneBy(Person, { email })
  const personId = known?.id ?? randomUUID()
  const kept = { createdAt: known?.createdAt ?? tx.at, isActive: true }
  await tx.manager.save(Person, { id: personId, name, email, passwordHash, ...kept })
  if (await tx.manager.existsBy(Membership, { districtId, personId })) return
  const membership = { districtId, personId, roles: [role], approvalLimits, isActive: true, createdAt: tx.at }
  await tx.manager.insert(Membership, membership)
}

async function districtIdOf({ manager, at }: AccountsTx, district: DemoDistrict): Promise<string> {
  const { name, timeZone, fiscalYearStartMonth, jobNumberPrefix } = district
  const known = await manager.findOneBy(District, { name })
  if (known !== null) return known.id
  const id = randomUUID()
  const described = { name, timeZone, fiscalYearStartMonth, jobNumberPrefix }
  await manager.insert(District, { id, ...described, checkerMayApprove: false, isDemo: true, createdAt: at })
  return id
}
