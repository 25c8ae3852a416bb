import { Injectable, type OnModuleInit } from '@nestjs/common'
import { QueueTasks } from '../platform/queue/queue-tasks.js'
import { sendMailPayloadSchema, sendMailTask } from './send-mail-task.js'
import { SendMailService } from './send-mail.service.js'

/** Enters the sending of mail in the queue. */
@Injectable()
export class SendMailTask implements OnModuleInit {
  constructor(
    private readonly tasks: QueueTasks,
    private readonly sender: SendMailService,
  ) {}

  onModuleInit(): void {
    this.tasks.register(sendMailTask, sendMailPayloadSchema, (payload, { isLast }) =>
      this.sender.send(payload, { isLastTry: isLast }),
    )
  }
}
