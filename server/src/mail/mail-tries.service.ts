import { Injectable } from '@nestjs/common'
import type { SendMailOptions } from 'nodemailer'
import type { Tx } from '../platform/database/tx.js'
import { EventLog } from '../platform/events/event-log.service.js'
import { FileStore } from '../platform/storage/file-store.service.js'
import { MailMessage } from './mail-message.entity.js'

/** Keeps book of every try to send a message. */
@Injectable()
export class MailTriesService {
  constructor(
    private readonly files: FileStore,
    private readonly events: EventLog,
  ) {}

  /** Counts the try before it is made. @returns the message, or null when it is sent or given up already. */
  async begin(tx: Tx, mailId: string): Promise<SendMailOptions | null> {
    const message = await tx.manager.findOneOrFail(MailMessage, {
      where: { districtId: tx.districtId, id: mailId },
      lock: { mode: 'pessimistic_write' },
    })
    if (message.status !== 'waiting' || message.text === null) return null
    await this.change(tx, mailId, { attempts: message.attempts + 1 })
    return {
      // An object, so that the address is taken as it is and never read as a list.
      to: { name: '', address: message.toAddress },
      subject: message.subject,
      text: message.text,
      messageId: message.messageId,
      date: message.queuedAt,
      headers: { 'Auto-Submitted': 'auto-generated' },
      attachments: await this.attachmentsOf(tx, message),
    }
  }

  async recordSent(tx: Tx, mailId: string): Promise<void> {
    const message = await this.find(tx, mailId)
    await this.change(tx, mailId, { status: 'sent', sentAt: tx.at, lastError: null, ...wiped(message) })
    await this.tell(tx, message, 'mail-sent')
  }

  async recordFailure(
    tx: Tx,
    mailId: string,
    { said, isFinal }: { said: string; isFinal: boolean },
  ): Promise<void> {
    const message = await this.find(tx, mailId)
    const end = isFinal ? { status: 'failed' as const, ...wiped(message) } : {}
    await this.change(tx, mailId, { lastError: said, ...end })
    if (isFinal) await this.tell(tx, message, 'mail-failed')
  }

  private async attachmentsOf(
    tx: Tx,
    { attachmentFileId, attachmentName }: MailMessage,
  ): Promise<SendMailOptions['attachments']> {
    if (attachmentFileId === null || attachmentName === null) return []
    const { bytes, contentType } = await this.files.read(tx, attachmentFileId)
    return [{ filename: attachmentName, content: bytes, contentType }]
  }

  private find(tx: Tx, mailId: string): Promise<MailMessage> {
    return tx.manager.findOneByOrFail(MailMessage, { districtId: tx.districtId, id: mailId })
  }

  private async change(tx: Tx, mailId: string, change: Partial<MailMessage>): Promise<void> {
    await tx.manager.update(MailMessage, { districtId: tx.districtId, id: mailId }, change)
  }

  private async tell(tx: Tx, { id, jobId, kind, attempts }: MailMessage, event: string): Promise<void> {
    if (jobId === null) return
    await this.events.append(tx, {
      streamId: jobId,
      kind: event,
      facts: { mailId: id, mailKind: kind, attempts },
    })
  }
}

const wiped = ({ isSecret }: MailMessage): Partial<MailMessage> => (isSecret ? { text: null } : {})
