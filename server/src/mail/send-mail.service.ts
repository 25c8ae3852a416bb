import { Injectable } from '@nestjs/common'
import type { SendMailOptions } from 'nodemailer'
import { UnitOfWork, type Scope } from '../platform/database/unit-of-work.js'
import { isRefusedForGood, smtpErrorText } from './smtp-error.js'
import { MailTransport } from './mail-transport.js'
import { MailTriesService } from './mail-tries.service.js'
import type { SendMailPayload } from './send-mail-task.js'

/**
 * Sends one message. However often the task is run, what is sent stays sent, and every try carries the same
 * Message-ID: a server that stops between sending and writing it down may repeat a message, and its reader can tell.
 */
@Injectable()
export class SendMailService {
  constructor(
    private readonly work: UnitOfWork,
    private readonly transport: MailTransport,
    private readonly tries: MailTriesService,
  ) {}

  /** @throws what the mail server said, when another try may help. */
  async send({ districtId, mailId }: SendMailPayload, { isLastTry }: { isLastTry: boolean }): Promise<void> {
    const scope: Scope = { districtId, personId: null }
    const message = await this.work.run(scope, (tx) => this.tries.begin(tx, mailId))
    if (message === null) return
    const error = await this.tryOnce(message)
    if (error === null) {
      await this.work.run(scope, (tx) => this.tries.recordSent(tx, mailId))
      return
    }
    const isFinal = isLastTry || isRefusedForGood(error)
    await this.work.run(scope, (tx) =>
      this.tries.recordFailure(tx, mailId, { said: smtpErrorText(error), isFinal }),
    )
    if (!isFinal) throw error
  }

  private async tryOnce(message: SendMailOptions): Promise<Error | null> {
    try {
      await this.transport.send(message)
      return null
    } catch (error) {
      return error instanceof Error ? error : new Error(String(error))
    }
  }
}
