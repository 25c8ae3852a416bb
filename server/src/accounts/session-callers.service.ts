import { Injectable } from '@nestjs/common'
import { CallerLookup, type KnownCaller } from '../platform/auth/caller.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { SessionsService } from './sessions.service.js'

/** Answers the guard's question from the stored sessions. */
@Injectable()
export class SessionCallers extends CallerLookup {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly sessions: SessionsService,
  ) {
    super()
  }

  async find(sessionId: string): Promise<KnownCaller | null> {
    const live = await this.unitOfWork.runForAccounts((tx) => this.sessions.findLive(tx, sessionId))
    if (live === null) return null
    const { session, person, roles } = live
    return {
      sessionId,
      onlyJobId: session.jobId,
      actor: { personId: person.id, districtId: session.districtId, roles },
    }
  }
}
