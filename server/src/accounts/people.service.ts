import { randomBytes, randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type PersonInput, type PersonView, type Role } from 'shared'
import { In } from 'typeorm'
import { Config } from '../platform/config/config.js'
import { withAccounts } from '../platform/database/unit-of-work.js'
import type { AccountsTx, Tx } from '../platform/database/tx.js'
import { Membership } from './membership.entity.js'
import { hashPassword } from './password-hash.js'
import { Person } from './person.entity.js'

/** Those who work in a district or own land in it. A person may belong to several districts. */
@Injectable()
export class PeopleService {
  constructor(private readonly config: Config) {}

  async list(tx: Tx): Promise<PersonView[]> {
    const memberships = await tx.manager.findBy(Membership, { districtId: tx.districtId })
    const ids = memberships.map(({ personId }) => personId)
    const people = await tx.manager.find(Person, { where: { id: In(ids) }, order: { name: 'ASC' } })
    const held = new Map(memberships.map((membership) => [membership.personId, membership]))
    return people.flatMap((person) => {
      const membership = held.get(person.id)
      return membership === undefined ? [] : [personView(person, membership)]
    })
  }

  /**
   * Adds a member of staff. A person new to Wadestone gets a password that is shown once. For one who is known
   * already nobody here may make a password: it would open the other districts of that person too.
   */
  async add(tx: Tx, input: PersonInput): Promise<{ person: PersonView; temporaryPassword: string | null }> {
    return withAccounts(tx, async (accounts) => {
      const known = await accounts.manager.findOneBy(Person, { email: input.email })
      const temporaryPassword = known === null ? randomBytes(15).toString('base64url') : null
      const person = known ?? (await this.make(accounts, input))
      if (temporaryPassword !== null) {
        const passwordHash = await hashPassword(temporaryPassword, this.config.secrets.passwordPepper)
        await accounts.manager.update(Person, { id: person.id }, { passwordHash })
      }
      const membership = await this.join(tx, person, input.roles)
      if (membership === null) {
        const message = `${input.email} belongs to this district already.`
        throw new Problem('already-exists', { detail: message, fields: [{ pointer: '/email', message }] })
      }
      const { approvalLimits } = input
      await tx.manager.update(Membership, idOf(membership), { approvalLimits })
      return { person: personView(person, { ...membership, approvalLimits }), temporaryPassword }
    })
  }

  /** A producer with an e-mail can come by a mailed link, so there is a person for it. No password is made. */
  async ensureLandowner(tx: Tx, { name, email }: { name: string; email: string }): Promise<string> {
    return withAccounts(tx, async (accounts) => {
      const known = await accounts.manager.findOneBy(Person, { email })
      const person = known ?? (await this.make(accounts, { name, email }))
      const joined = await this.join(tx, person, ['landowner'])
      if (joined === null) await this.addRole(tx, person.id, 'landowner')
      return person.id
    })
  }

  private async make(tx: AccountsTx, { name, email }: { name: string; email: string }): Promise<Person> {
    const person = tx.manager.create(Person, {
      id: randomUUID(),
      name,
      email,
      passwordHash: null,
      isActive: true,
      createdAt: tx.at,
    })
    await tx.manager.insert(Person, person)
    return person
  }

  /** Null when the person is a member already. */
  private async join(tx: Tx, { id: personId }: Person, roles: Role[]): Promise<Membership | null> {
    const { districtId } = tx
    if (await tx.manager.existsBy(Membership, { districtId, personId })) return null
    const membership = tx.manager.create(Membership, {
      districtId,
      personId,
      roles,
      approvalLimits: null,
      isActive: true,
      createdAt: tx.at,
    })
    await tx.manager.insert(Membership, membership)
    return membership
  }

  private async addRole({ manager, districtId }: Tx, personId: string, role: Role): Promise<void> {
    const membership = await manager.findOneByOrFail(Membership, { districtId, personId })
    if (membership.roles.includes(role)) return
    await manager.update(Membership, idOf(membership), { roles: [...membership.roles, role] })
  }
}

const idOf = ({ districtId, personId }: Membership) => ({ districtId, personId })

const personView = (person: Person, { roles, approvalLimits, isActive }: Membership): PersonView => ({
  id: person.id,
  name: person.name,
  email: person.email,
  roles,
  approvalLimits,
  isActive: person.isActive && isActive,
})
