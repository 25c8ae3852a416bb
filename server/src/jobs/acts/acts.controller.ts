import { Body, Controller, HttpCode, Param, Post } from '@nestjs/common'
import { actSchema, type Act, type JobView } from 'shared'
import type { Caller } from '../../platform/auth/caller.js'
import { Requires } from '../../platform/auth/requires.decorator.js'
import { WhoCalls } from '../../platform/auth/who-calls.decorator.js'
import { Intended, type Intention } from '../../platform/idempotency/intended.decorator.js'
import { OnceService } from '../../platform/idempotency/once.service.js'
import { idParam } from '../../platform/web/id-param.js'
import { parsedBy } from '../../platform/web/parsed-by.js'
import { ActsService } from './acts.service.js'

@Controller('jobs/:id/acts')
export class ActsController {
  constructor(
    private readonly once: OnceService,
    private readonly acts: ActsService,
  ) {}

  @Post()
  @HttpCode(200)
  @Requires('job:act')
  apply(
    @WhoCalls() caller: Caller,
    @Param('id', idParam) jobId: string,
    @Body(parsedBy(actSchema)) act: Act,
    @Intended() intention: Intention,
  ): Promise<JobView> {
    return this.once.run(caller.actor, intention, (tx) =>
      this.acts.apply(tx, caller, { jobId, act, origin: originOf(caller) }),
    )
  }
}

const originOf = ({ sessionId, onlyJobId, remoteAddress, userAgent }: Caller) => ({
  sessionId,
  cameByLink: onlyJobId !== null,
  remoteAddress,
  userAgent,
})
