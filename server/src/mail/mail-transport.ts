import { Injectable, type OnModuleDestroy } from '@nestjs/common'
import { createTransport, type SendMailOptions, type Transporter } from 'nodemailer'
import { Config } from '../platform/config/config.js'
import { smtpOptions } from './smtp-options.js'

/** The way to the district's mail server. */
@Injectable()
export class MailTransport implements OnModuleDestroy {
  private readonly transporter: Transporter

  constructor(private readonly config: Config) {
    this.transporter = createTransport(smtpOptions(config.smtpUrl))
  }

  async send(message: SendMailOptions): Promise<void> {
    // A letter is made of what is given here, and never of a file or address that a text names.
    const own = { from: this.config.mailFrom, disableFileAccess: true, disableUrlAccess: true }
    await this.transporter.sendMail({ ...own, ...message })
  }

  onModuleDestroy(): void {
    this.transporter.close()
  }
}
