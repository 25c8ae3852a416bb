import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { Config } from '../platform/config/config.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { hashPassword, isPassword } from './password-hash.js'
import { refuseWeakPassword } from './password-rules.js'
import { Person } from './person.entity.js'
import { SessionsService } from './sessions.service.js'

export interface PasswordChange {
  personId: string
  sessionId: string
  currentPassword: string
  newPassword: string
}

@Injectable()
export class PasswordService {
  constructor(
    private readonly config: Config,
    private readonly unitOfWork: UnitOfWork,
    private readonly sessions: SessionsService,
  ) {}

  /** Whoever else is signed in as this person is signed out: a changed password may mean a stolen one. */
  async change({ personId, sessionId, currentPassword, newPassword }: PasswordChange): Promise<void> {
    const { passwordPepper } = this.config.secrets
    const person = await this.unitOfWork.runForAccounts((tx) =>
      tx.manager.findOneByOrFail(Person, { id: personId }),
    )
    if (!(await isPassword(currentPassword, person.passwordHash, passwordPepper))) {
      const message = 'This is not the password you use now.'
      throw new Problem('invalid-fields', {
        detail: message,
        fields: [{ pointer: '/currentPassword', message }],
      })
    }
    refuseWeakPassword(newPassword, person)
    const passwordHash = await hashPassword(newPassword, passwordPepper)
    await this.unitOfWork.runForAccounts(async (tx) => {
      await tx.manager.update(Person, { id: personId }, { passwordHash })
      await this.sessions.endOthers(tx, personId, sessionId)
    })
  }
}
