import { Body, Controller, Get, HttpCode, Param, Post } from '@nestjs/common'
import { costListInputSchema, type CostListInput, type CostListView } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { Intended, type Intention } from '../platform/idempotency/intended.decorator.js'
import { OnceService } from '../platform/idempotency/once.service.js'
import { idParam } from '../platform/web/id-param.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { CostListsService } from './cost-lists.service.js'

/** Prices belong to the money the office keeps, so they go by the permissions of schedules. */
@Controller('cost-lists')
export class CostListsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly once: OnceService,
    private readonly lists: CostListsService,
  ) {}

  @Get()
  @Requires('schedule:read')
  list(@WhoCalls() { actor }: Caller): Promise<CostListView[]> {
    return this.unitOfWork.run(actor, (tx) => this.lists.list(tx))
  }

  @Post()
  @Requires('schedule:write')
  create(
    @WhoCalls() { actor }: Caller,
    @Body(parsedBy(costListInputSchema)) input: CostListInput,
  ): Promise<CostListView> {
    return this.unitOfWork.run(actor, (tx) => this.lists.create(tx, input))
  }

  @Post(':id/put-in-force')
  @HttpCode(200)
  @Requires('schedule:write')
  putInForce(
    @WhoCalls() { actor }: Caller,
    @Intended() intention: Intention,
    @Param('id', idParam) id: string,
  ): Promise<CostListView> {
    return this.once.run(actor, intention, (tx) => this.lists.putInForce(tx, id))
  }
}
