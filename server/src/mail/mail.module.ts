import { Module } from '@nestjs/common'
import { MailLogService } from './mail-log.service.js'
import { MailTransport } from './mail-transport.js'
import { MailTriesService } from './mail-tries.service.js'
import { MailService } from './mail.service.js'
import { SendMailService } from './send-mail.service.js'
import { SendMailTask } from './send-mail.task.js'

/** Imports no other domain, so that any of them may post letters. */
@Module({
  providers: [MailLogService, MailService, MailTransport, MailTriesService, SendMailService, SendMailTask],
  exports: [MailLogService, MailService],
})
export class MailModule {}
