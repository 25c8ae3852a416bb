import { Controller, Get } from '@nestjs/common'
import type { DeskItem } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { DeskService } from './desk.service.js'

@Controller('desk')
export class DeskController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly desk: DeskService,
  ) {}

  @Get()
  @Requires('signed-in')
  list(@WhoCalls() caller: Caller): Promise<DeskItem[]> {
    return this.unitOfWork.run(caller.actor, (tx) => this.desk.list(tx, caller))
  }
}
