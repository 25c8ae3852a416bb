import { Injectable } from '@nestjs/common'
import { EntryLinksService } from '../../accounts/entry-links.service.js'
import { MailService } from '../../mail/mail.service.js'
import { PacketsService } from '../../packets/packets.service.js'
import type { Tx } from '../../platform/database/tx.js'
import type { ActContext, ActEffect } from './act-context.js'
import { jobInLetter } from './job-in-letter.js'
import { packetBOf } from './packet-of-act.js'
import { RecipientsService } from './recipients.service.js'

/** The two acts that put a job in the post: the invitation to sign, and the approved packet. */
@Injectable()
export class OfficeActs {
  constructor(
    private readonly recipients: RecipientsService,
    private readonly links: EntryLinksService,
    private readonly mail: MailService,
    private readonly packets: PacketsService,
  ) {}

  /** Each signer with an e-mail gets a link of their own. Who has none gets paper, which no queue can send. */
  async inviteSigners(tx: Tx, { job }: Pick<ActContext, 'job'>): Promise<ActEffect> {
    const signers = await this.recipients.signers(tx, job.id)
    for (const { personId, name, address } of signers) {
      const { token, daysValid } = await this.links.make(tx, { personId, jobId: job.id })
      await this.mail.post(tx, {
        kind: 'entry-link',
        jobId: job.id,
        to: { personId, address },
        facts: { ...jobInLetter(job), recipientName: name, token, daysValid },
      })
    }
    return { facts: { messages: signers.length } }
  }

  async sendPacket(tx: Tx, context: ActContext<'send'>): Promise<ActEffect> {
    const { job } = context
    const { packetId, sha256 } = packetBOf(context)
    const fileId = await this.packets.fileIdOf(tx, packetId)
    const fileName = `${job.number}-packet.pdf`
    const producers = await this.recipients.producers(tx, job.id)
    for (const { personId, name, address } of producers) {
      await this.mail.post(tx, {
        kind: 'packet',
        jobId: job.id,
        to: { personId, address },
        facts: { ...jobInLetter(job), recipientName: name, fileName, sha256 },
        attachment: { fileId, fileName },
      })
    }
    return { facts: { packetId, packetSha256: sha256, messages: producers.length } }
  }
}
