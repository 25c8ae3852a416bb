import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common'
import { criteriaSetInputSchema, type CriteriaSetInput, type CriteriaSetView } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../platform/idempotency/intended.decorator.js'
import { OnceService } from '../platform/idempotency/once.service.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { CriteriaSetsService } from './criteria-sets.service.js'

@Controller('criteria-sets')
export class CriteriaSetsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly once: OnceService,
    private readonly sets: CriteriaSetsService,
  ) {}

  @Get()
  @Requires('criteria:read')
  list(@WhoCalls() { actor }: Caller): Promise<CriteriaSetView[]> {
    return this.unitOfWork.run(actor, (tx) => this.sets.list(tx))
  }

  @Post()
  @Requires('criteria:write')
  create(
    @WhoCalls() { actor }: Caller,
    @Body(parsedBy(criteriaSetInputSchema)) input: CriteriaSetInput,
  ): Promise<CriteriaSetView> {
    return this.unitOfWork.run(actor, (tx) => this.sets.create(tx, input))
  }

  @Post(':id/put-in-force')
  @HttpCode(200)
  @Requires('criteria:write')
  putInForce(
    @WhoCalls() { actor }: Caller,
    @Intended() intention: Intention,
    @Param('id', idParam) id: string,
  ): Promise<CriteriaSetView> {
    return this.once.run(actor, intention, (tx) => this.sets.putInForce(tx, id))
  }
}
