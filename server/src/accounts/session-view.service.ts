import { Injectable } from '@nestjs/common'
import { Problem, type SessionView } from 'shared'
import { In } from 'typeorm'
import { District } from '../districts/district.entity.js'
import type { AccountsTx } from '../platform/database/tx.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Membership } from './membership.entity.js'
import { SessionsService, type LiveSession } from './sessions.service.js'

/** What the client learns of who is signed in, where, and where else they may work. */
@Injectable()
export class SessionViewService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly sessions: SessionsService,
  ) {}

  read(sessionId: string): Promise<SessionView> {
    return this.unitOfWork.runForAccounts(async (tx) => {
      const live = await this.sessions.findLive(tx, sessionId)
      if (live === null) throw new Problem('not-signed-in')
      return this.viewOf(tx, live)
    })
  }

  private async viewOf(tx: AccountsTx, { session, person, roles }: LiveSession): Promise<SessionView> {
    const memberships = await tx.manager.findBy(Membership, { personId: person.id, isActive: true })
    const ids = memberships.map(({ districtId }) => districtId)
    const districts = await tx.manager.findBy(District, { id: In(ids) })
    const named = new Map(districts.map((district) => [district.id, district]))
    const here = named.get(session.districtId)
    if (here === undefined) throw new Error(`Session ${session.id} names a district that is gone.`)
    const { id, name, timeZone, isDemo } = here
    return {
      sessionId: session.id,
      personId: person.id,
      name: person.name,
      email: person.email,
      district: { id, name, timeZone, isDemo },
      roles,
      memberships:
        session.jobId === null
          ? memberships.map(({ districtId, roles: held }) => ({
              districtId,
              districtName: named.get(districtId)?.name ?? '',
              roles: held,
            }))
          : [],
      jobId: session.jobId,
    }
  }
}
