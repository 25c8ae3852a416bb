import { Injectable } from '@nestjs/common'
import { randomUUID } from 'node:crypto'
import { emailSchema, lineOfText, Problem } from 'shared'
import { District } from '../districts/district.entity.js'
import { Config } from '../platform/config/config.js'
import type { Tx } from '../platform/database/tx.js'
import { Queue } from '../platform/queue/queue.service.js'
import { letterText, type JobInLetter } from './letters/letter.js'
import { letters, secretKinds, type LetterFacts, type MailKind } from './letters/letters.js'
import { MailMessage } from './mail-message.entity.js'
import { sendMailTask, type SendMailPayload } from './send-mail-task.js'

export type { JobInLetter }

export interface MailToPost<Kind extends MailKind> {
  kind: Kind
  jobId: string | null
  to: { personId: string | null; address: string }
  facts: LetterFacts[Kind]
  attachment?: { fileId: string; fileName: string }
}

const subjectSchema = lineOfText(300)

/** The queue waits longer before each try: twelve reach over more than ten hours without a mail server. */
const mostTries = 12

/** Puts letters in the post. They leave after the transaction is committed, and never when it is undone. */
@Injectable()
export class MailService {
  constructor(
    private readonly config: Config,
    private readonly queue: Queue,
  ) {}

  async post<Kind extends MailKind>(
    tx: Tx,
    { kind, jobId, to, facts, attachment }: MailToPost<Kind>,
  ): Promise<MailMessage> {
    const letter = letters[kind](facts, this.config.publicOrigin)
    const id = randomUUID()
    const message = tx.manager.create(MailMessage, {
      districtId: tx.districtId,
      id,
      jobId,
      kind,
      toPersonId: to.personId,
      // Parsed once more at the last gate: a line break in an address or subject would add headers of its own.
      toAddress: emailSchema.parse(to.address),
      subject: subjectSchema.parse(letter.subject),
      text: letterText(letter, await districtName(tx)),
      isSecret: secretKinds.includes(kind),
      messageId: `<${id}@${new URL(this.config.publicOrigin).hostname}>`,
      status: 'waiting',
      attempts: 0,
      queuedAt: tx.at,
      sentAt: null,
      lastError: null,
      attachmentFileId: attachment?.fileId ?? null,
      attachmentName: attachment?.fileName ?? null,
      queuedBy: tx.personId,
    })
    await tx.manager.insert(MailMessage, message)
    await this.enqueue(tx, id)
    return message
  }

  /**
   * Puts a failed message in the post once more, under its old Message-ID.
   *
   * @throws Problem not-found, or transition-not-allowed for one that did not fail or whose text is gone.
   */
  async postAgain(tx: Tx, { jobId, mailId }: { jobId: string; mailId: string }): Promise<void> {
    const message = await tx.manager.findOne(MailMessage, {
      where: { districtId: tx.districtId, id: mailId, jobId },
      lock: { mode: 'pessimistic_write' },
    })
    if (message === null) throw new Problem('not-found')
    const reason = refusalToRepeat(message)
    if (reason !== null) throw new Problem('transition-not-allowed', { detail: reason, reasons: [reason] })
    await tx.manager.update(MailMessage, { districtId: tx.districtId, id: mailId }, { status: 'waiting' })
    await this.enqueue(tx, mailId)
  }

  private async enqueue(tx: Tx, mailId: string): Promise<void> {
    const payload: SendMailPayload = { districtId: tx.districtId, mailId }
    await this.queue.add(tx, sendMailTask, payload, { maxAttempts: mostTries })
  }
}

function refusalToRepeat({ status, text }: MailMessage): string | null {
  if (status !== 'failed') return 'Only a message that failed can be sent again.'
  return text === null ? 'The way in that this message carried is gone. Send the link again instead.' : null
}

async function districtName({ manager, districtId }: Tx): Promise<string> {
  const where = { id: districtId }
  const { name } = await manager.findOneOrFail(District, { select: { id: true, name: true }, where })
  return name
}
