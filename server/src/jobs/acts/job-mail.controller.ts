import { Controller, Get, Param } from '@nestjs/common'
import type { MailView } from 'shared'
import { MailLogService } from '../../mail/mail-log.service.js'
import type { Caller } from '../../platform/auth/caller.js'
import { Requires } from '../../platform/auth/requires.decorator.js'
import { WhoCalls } from '../../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../../platform/database/unit-of-work.js'
import { idParam } from '../../platform/web/id-param.js'
import { JobAccessService } from '../job-access.service.js'

@Controller('jobs/:id/mail')
export class JobMailController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly jobs: JobAccessService,
    private readonly mail: MailLogService,
  ) {}

  @Get()
  @Requires('mail:read')
  list(@WhoCalls() caller: Caller, @Param('id', idParam) jobId: string): Promise<MailView[]> {
    return this.unitOfWork.run(caller.actor, async (tx) => {
      await this.jobs.find(tx, caller, 'mail:read', jobId, 'to-read')
      return this.mail.ofJob(tx, jobId)
    })
  }
}
