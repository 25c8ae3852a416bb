import { createHmac, randomInt, randomUUID, timingSafeEqual } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { IsNull, LessThan, MoreThan } from 'typeorm'
import { MailService } from '../mail/mail.service.js'
import { Config } from '../platform/config/config.js'
import { UnitOfWork, withAccounts } from '../platform/database/unit-of-work.js'
import type { AccountsTx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { EntryCode } from './entry-code.entity.js'
import type { EntryLink } from './entry-link.entity.js'
import { EntryLinksService } from './entry-links.service.js'
import type { Session } from './session.entity.js'
import { SessionsService } from './sessions.service.js'

const minutesValid = 10
const mostTries = 5
const mostCodesAnHour = 6

/** The landowner's way in: the mailed link, then a code mailed to the same box, typed in the browser that asked. */
@Injectable()
export class EntryService {
  constructor(
    private readonly config: Config,
    private readonly unitOfWork: UnitOfWork,
    private readonly links: EntryLinksService,
    private readonly sessions: SessionsService,
    private readonly mail: MailService,
    private readonly events: EventLog,
  ) {}

  /** Mails a new code; the one before it is spent. */
  async open(token: string): Promise<{ emailHint: string }> {
    const found = await this.unitOfWork.runForAccounts((tx) => this.links.find(tx, token))
    const scope = { personId: found.personId, districtId: found.districtId }
    return this.unitOfWork.run(scope, async (tx) => {
      const { link, person } = await withAccounts(tx, async (accounts) => {
        const held = await this.links.hold(accounts, token)
        await this.refuseFlood(accounts, held)
        return { link: held, person: await this.links.personOf(accounts, held) }
      })
      const code = String(randomInt(1_000_000)).padStart(6, '0')
      const { districtId, at } = tx
      await tx.manager.update(EntryCode, { districtId, linkId: link.id, usedAt: IsNull() }, { usedAt: at })
      await tx.manager.insert(EntryCode, {
        id: randomUUID(),
        districtId,
        linkId: link.id,
        codeHash: this.hashOf(link, code),
        createdAt: at,
        expiresAt: new Date(at.getTime() + minutesValid * 60_000),
        tries: 0,
        usedAt: null,
      })
      await this.mail.post(tx, {
        kind: 'entry-code',
        jobId: link.jobId,
        to: { personId: person.id, address: person.email },
        facts: { code, minutesValid },
      })
      return { emailHint: hint(person.email) }
    })
  }

  /** @throws Problem wrong-code whatever is wrong with it. A wrong try stays counted. */
  async enter({
    token,
    code,
    userAgent,
  }: {
    token: string
    code: string
    userAgent: string
  }): Promise<Session> {
    const session = await this.unitOfWork.runForAccounts(async (tx) => {
      const link = await this.links.hold(tx, token)
      await this.links.personOf(tx, link)
      if (!(await this.spend(tx, link, code))) return null
      const { personId, districtId, jobId } = link
      return this.sessions.begin(tx, { personId, districtId, jobId, userAgent })
    })
    if (session === null) {
      throw new Problem('wrong-code', { detail: 'Check the six digits, or ask for a new code.' })
    }
    await this.note(session)
    return session
  }

  /** That the person came by link and code is part of what a signature stands on. */
  private async note({ id: sessionId, personId, districtId, jobId }: Session): Promise<void> {
    if (jobId === null) return
    await this.unitOfWork.run({ personId, districtId }, (tx) =>
      this.events.append(tx, { streamId: jobId, kind: 'came-by-link', facts: { sessionId } }),
    )
  }

  /** Counts the try and marks the code used in one statement, so that two tries at once cannot share it. */
  private async spend(tx: AccountsTx, link: EntryLink, code: string): Promise<boolean> {
    const found = await tx.manager.findOne(EntryCode, {
      where: { linkId: link.id, usedAt: IsNull(), expiresAt: MoreThan(tx.at), tries: LessThan(mostTries) },
      order: { createdAt: 'DESC' },
      lock: { mode: 'pessimistic_write' },
    })
    if (found === null) return false
    const fits = timingSafeEqual(Buffer.from(found.codeHash), Buffer.from(this.hashOf(link, code)))
    const change = fits ? { usedAt: tx.at } : { tries: found.tries + 1 }
    await tx.manager.update(EntryCode, { id: found.id }, change)
    return fits
  }

  private async refuseFlood(tx: AccountsTx, link: EntryLink): Promise<void> {
    const hourAgo = new Date(tx.at.getTime() - 3_600_000)
    const made = await tx.manager.countBy(EntryCode, { linkId: link.id, createdAt: MoreThan(hourAgo) })
    if (made < mostCodesAnHour) return
    throw new Problem('too-many-tries', {
      retryAfterSeconds: 3600,
      detail: 'Several codes were mailed within the hour. Use the newest, or try again later.',
    })
  }

  /** Six digits alone could be found by trying all of them against a stolen table; the key stops that. */
  private hashOf(link: EntryLink, code: string): string {
    return createHmac('sha256', this.config.secrets.jwtSecret)
      .update(`${link.id} ${code}`)
      .digest('base64url')
  }
}

/** Enough to recognise one's own box, too little to learn somebody else's. */
function hint(email: string): string {
  const [box = '', host = ''] = email.split('@')
  return `${box.slice(0, 1)}…@${host}`
}
