import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { Config } from '../platform/config/config.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import type { AccountsTx } from '../platform/database/tx.js'
import { Membership } from './membership.entity.js'
import { isPassword } from './password-hash.js'
import { Person } from './person.entity.js'
import type { Session } from './session.entity.js'
import { SessionsService } from './sessions.service.js'
import { SignInThrottle } from './sign-in-throttle.service.js'

export interface SignInRequest {
  email: string
  password: string
  ip: string
  userAgent: string
}

/** Sign-in by e-mail and password. Whatever is wrong, the answer is the same. */
@Injectable()
export class SignInService {
  constructor(
    private readonly config: Config,
    private readonly unitOfWork: UnitOfWork,
    private readonly sessions: SessionsService,
    private readonly throttle: SignInThrottle,
  ) {}

  async signIn(request: SignInRequest): Promise<Session> {
    const person = await this.unitOfWork.runForAccounts(async (tx) => {
      await this.throttle.begin(tx, request)
      return tx.manager.findOneBy(Person, { email: request.email })
    })
    // Compared outside a transaction: it takes long on purpose, and must not hold a connection meanwhile.
    const { passwordPepper } = this.config.secrets
    const fits = await isPassword(request.password, person?.passwordHash ?? null, passwordPepper)
    const session = await this.unitOfWork.runForAccounts(async (tx) => {
      const opened = person !== null && fits && person.isActive ? await this.open(tx, person, request) : null
      if (opened !== null) await this.throttle.succeed(tx, request)
      return opened
    })
    if (session === null) throw new Problem('wrong-sign-in')
    return session
  }

  private async open(tx: AccountsTx, person: Person, { userAgent }: SignInRequest): Promise<Session | null> {
    const [first] = await tx.manager.find(Membership, {
      where: { personId: person.id, isActive: true },
      order: { createdAt: 'ASC', districtId: 'ASC' },
      take: 1,
    })
    if (first === undefined) return null
    return this.sessions.begin(tx, { personId: person.id, districtId: first.districtId, userAgent })
  }
}
