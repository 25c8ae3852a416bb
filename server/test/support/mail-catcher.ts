import type { AddressInfo } from 'node:net'
import { simpleParser, type ParsedMail } from 'mailparser'
import { SMTPServer } from 'smtp-server'

export const refusal = 'Mailbox not available'

/** A real SMTP server on loopback that keeps what it is given, or refuses it when a test says so. */
export class MailCatcher {
  readonly mails: ParsedMail[] = []
  readonly refused: ParsedMail[] = []
  /** The answers to the next messages, such as 450; when none is left messages are taken. */
  refusals: number[] = []
  private readonly server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onData: (stream, _session, done) => {
      simpleParser(stream).then(
        (mail) => {
          const responseCode = this.refusals.shift()
          const box = responseCode === undefined ? this.mails : this.refused
          box.push(mail)
          done(responseCode === undefined ? null : Object.assign(new Error(refusal), { responseCode }))
        },
        (error: Error) => done(error),
      )
    },
  })

  async listen(): Promise<string> {
    await new Promise<void>((resolve) => this.server.listen(0, '127.0.0.1', () => resolve()))
    return `smtp://127.0.0.1:${(this.server.server.address() as AddressInfo).port}`
  }

  /** What was mailed to an address, oldest first. */
  to(address: string): ParsedMail[] {
    return this.mails.filter(({ to }) => to !== undefined && !Array.isArray(to) && to.text.includes(address))
  }

  async close(): Promise<void> {
    await new Promise<void>((resolve) => this.server.close(() => resolve()))
  }
}
