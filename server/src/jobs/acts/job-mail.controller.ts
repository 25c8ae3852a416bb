import { Controller, Get, HttpCode, Param, Post } from '@nestjs/common'
import type { MailView } from 'shared'
import { MailLogService } from '../../mail/mail-log.service.js'
import type { Caller } from '../../platform/auth/caller.js'
import { Requires } from '../../platform/auth/requires.decorator.js'
import { WhoCalls } from '../../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../../platform/idempotency/intended.decorator.js'
import { OnceService } from '../../platform/idempotency/once.service.js'
import { idParam } from '../../platform/web/id-param.js'
import { JobAccessService } from '../job-access.service.js'
import { SecondTriesService } from './second-tries.service.js'

@Controller('jobs/:id')
export class JobMailController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly jobs: JobAccessService,
    private readonly mail: MailLogService,
    private readonly once: OnceService,
    private readonly secondTries: SecondTriesService,
  ) {}

  @Get('mail')
  @Requires('mail:read')
  list(@WhoCalls() caller: Caller, @Param('id', idParam) jobId: string): Promise<MailView[]> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      await this.jobs.find(tx, caller, 'mail:read', jobId, 'to-read')
      return this.mail.ofJob(tx, jobId)
    })
  }

  @Post('mail/:mailId/send-again')
  @HttpCode(202)
  @Requires('mail:send-again')
  sendAgain(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Param('mailId', idParam) mailId: string,
    @Intended() intention: Intention,
  ): Promise<MailView[]> {
    return this.once.run(caller.actor, intention, (tx) =>
      this.secondTries.sendMailAgain(tx, caller, { jobId, mailId }),
    )
  }

  @Post('links')
  @HttpCode(202)
  @Requires('mail:send-again')
  sendLinksAgain(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Intended() intention: Intention,
  ): Promise<MailView[]> {
    return this.once.run(caller.actor, intention, (tx) => this.secondTries.sendLinksAgain(tx, caller, jobId))
  }
}
