import { randomUUID } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem, type Role, type SessionListItem } from 'shared'
import { IsNull, MoreThan, Not } from 'typeorm'
import type { AccountsTx } from '../platform/database/tx.js'
import { Membership } from './membership.entity.js'
import { Person } from './person.entity.js'
import { Session } from './session.entity.js'

/** A working day: after it one signs in again, however busy one was. */
const sessionHours = 12

/** Last seen is a label for people; writing it on every request would make each read a write. */
const seenEveryMs = 60_000

export interface LiveSession {
  session: Session
  person: Person
  roles: Role[]
}

export interface SessionStart {
  personId: string
  districtId: string
  userAgent: string
  /** Set when a landowner came by a mailed link. */
  jobId?: string
}

@Injectable()
export class SessionsService {
  async begin(tx: AccountsTx, { personId, districtId, userAgent, jobId }: SessionStart): Promise<Session> {
    const session = tx.manager.create(Session, {
      id: randomUUID(),
      personId,
      districtId,
      jobId: jobId ?? null,
      userAgent: userAgent.slice(0, 300),
      startedAt: tx.at,
      lastSeenAt: tx.at,
      expiresAt: new Date(tx.at.getTime() + sessionHours * 3_600_000),
      revokedAt: null,
    })
    await tx.manager.insert(Session, session)
    return session
  }

  /** The session with today's roles, or null when it was ended, ran out, or the person may no longer come in. */
  async findLive(tx: AccountsTx, id: string): Promise<LiveSession | null> {
    const session = await tx.manager.findOneBy(Session, {
      id,
      revokedAt: IsNull(),
      expiresAt: MoreThan(tx.at),
    })
    if (session === null) return null
    const { personId, districtId } = session
    const person = await tx.manager.findOneBy(Person, { id: personId, isActive: true })
    const membership = await tx.manager.findOneBy(Membership, { personId, districtId, isActive: true })
    if (person === null || membership === null) return null
    await this.touch(tx, session)
    // A mailed link shows its job to a landowner; what else the person may be elsewhere does not come with it.
    const roles: Role[] = session.jobId === null ? membership.roles : ['landowner']
    return { session, person, roles }
  }

  async list(tx: AccountsTx, personId: string, thisId: string): Promise<SessionListItem[]> {
    const where = { personId, revokedAt: IsNull(), expiresAt: MoreThan(tx.at) }
    const sessions = await tx.manager.find(Session, { where, order: { lastSeenAt: 'DESC' } })
    return sessions.map(({ id, startedAt, lastSeenAt, userAgent }) => ({
      id,
      startedAt: startedAt.toISOString(),
      lastSeenAt: lastSeenAt.toISOString(),
      userAgent,
      isThis: id === thisId,
    }))
  }

  /** @throws Problem not-found for a district that the person is no member of, or a session by a mailed link. */
  async moveTo(
    tx: AccountsTx,
    { id, personId, districtId }: { id: string; personId: string; districtId: string },
  ): Promise<void> {
    const isMember = await tx.manager.existsBy(Membership, { personId, districtId, isActive: true })
    if (!isMember) throw new Problem('not-found')
    const own = { id, personId, jobId: IsNull(), revokedAt: IsNull() }
    const { affected } = await tx.manager.update(Session, own, { districtId })
    if (affected !== 1) throw new Problem('not-found')
  }

  async end(tx: AccountsTx, personId: string, id: string): Promise<void> {
    const { affected } = await tx.manager.update(
      Session,
      { id, personId, revokedAt: IsNull() },
      { revokedAt: tx.at },
    )
    if (affected !== 1) throw new Problem('not-found')
  }

  async endOthers(tx: AccountsTx, personId: string, thisId: string): Promise<void> {
    await tx.manager.update(Session, { personId, id: Not(thisId), revokedAt: IsNull() }, { revokedAt: tx.at })
  }

  private async touch(tx: AccountsTx, session: Session): Promise<void> {
    if (tx.at.getTime() - session.lastSeenAt.getTime() < seenEveryMs) return
    await tx.manager.update(Session, { id: session.id }, { lastSeenAt: tx.at })
  }
}
