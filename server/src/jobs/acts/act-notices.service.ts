import { Injectable } from '@nestjs/common'
import type { JobState } from 'shared'
import { MailService } from '../../mail/mail.service.js'
import type { Tx } from '../../platform/database/tx.js'
import type { ActContext } from './act-context.js'
import { jobInLetter } from './job-in-letter.js'
import { RecipientsService } from './recipients.service.js'

type Notice = (tx: Tx, context: ActContext) => Promise<void>

/** Tells those who act next that a job has come to them. */
@Injectable()
export class ActNoticesService {
  private readonly notices: Partial<Record<JobState, Notice>> = {
    returned: (tx, context) => this.tellPlanner(tx, context),
    'with-supervisor': (tx, context) => this.tellRole(tx, context, 'signed', 'supervisor'),
    approved: (tx, context) => this.tellRole(tx, context, 'approved', 'office'),
  }

  constructor(
    private readonly recipients: RecipientsService,
    private readonly mail: MailService,
  ) {}

  async post(tx: Tx, context: ActContext): Promise<void> {
    await this.notices[context.to]?.(tx, context)
  }

  private async tellPlanner(tx: Tx, context: ActContext): Promise<void> {
    const { job, facts } = context
    const returnedBy = context.act.action === 'return' ? 'supervisor' : 'landowner'
    for (const { personId, address } of await this.recipients.person(tx, facts.designerId ?? job.createdBy)) {
      await this.mail.post(tx, {
        kind: 'returned',
        jobId: job.id,
        to: { personId, address },
        facts: { ...jobInLetter(job), returnedBy, words: wordsOf(context) },
      })
    }
  }

  private async tellRole(
    tx: Tx,
    { job, revision }: ActContext,
    kind: 'signed' | 'approved',
    role: 'supervisor' | 'office',
  ): Promise<void> {
    for (const { personId, address } of await this.recipients.withRole(tx, role)) {
      await this.mail.post(tx, {
        kind,
        jobId: job.id,
        to: { personId, address },
        facts: { ...jobInLetter(job), revision: revision ?? 0 },
      })
    }
  }
}

/** What the person wrote with the act. */
function wordsOf({ act }: ActContext): readonly string[] {
  if ('notes' in act) return act.notes
  if ('note' in act) return [act.note]
  return 'reason' in act ? [act.reason] : []
}
