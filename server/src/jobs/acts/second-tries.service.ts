import { Injectable } from '@nestjs/common'
import { Problem, stateWords, type JobState, type MailView } from 'shared'
import { MailLogService } from '../../mail/mail-log.service.js'
import { MailService } from '../../mail/mail.service.js'
import type { Tx } from '../../platform/database/tx.js'
import { EventLog } from '../../platform/events/event-log.service.js'
import { JobAccessService, type Asking } from '../job-access.service.js'
import { OfficeActs } from './office-acts.service.js'

/** While a landowner has something to read. */
const readableStates: readonly JobState[] = ['with-landowner', 'with-supervisor', 'approved', 'sent']

/** For what the post lost: a message that failed, a link that ran out or went to a wrong address. */
@Injectable()
export class SecondTriesService {
  constructor(
    private readonly jobs: JobAccessService,
    private readonly office: OfficeActs,
    private readonly mail: MailService,
    private readonly log: MailLogService,
    private readonly events: EventLog,
  ) {}

  async sendMailAgain(
    tx: Tx,
    asking: Asking,
    { jobId, mailId }: { jobId: string; mailId: string },
  ): Promise<MailView[]> {
    await this.jobs.find(tx, asking, 'mail:send-again', jobId, 'to-change')
    await this.mail.postAgain(tx, { jobId, mailId })
    await this.events.append(tx, { streamId: jobId, kind: 'mail-again', facts: { mailId } })
    return this.log.ofJob(tx, jobId)
  }

  /** To the addresses as they are now; the earlier links end. */
  async sendLinksAgain(tx: Tx, asking: Asking, jobId: string): Promise<MailView[]> {
    const job = await this.jobs.find(tx, asking, 'mail:send-again', jobId, 'to-change')
    if (!readableStates.includes(job.state)) {
      const reason = `A job that is ${stateWords[job.state]} has nothing for the landowner to read.`
      throw new Problem('transition-not-allowed', { detail: reason, reasons: [reason] })
    }
    const { facts = {} } = await this.office.inviteSigners(tx, { job })
    await this.events.append(tx, { streamId: jobId, kind: 'link-again', facts })
    return this.log.ofJob(tx, jobId)
  }
}
