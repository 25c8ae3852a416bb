import { Controller, Delete, Get, HttpCode, Param } from '@nestjs/common'
import type { SessionListItem } from 'shared'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { idParam } from '../platform/web/id-param.js'
import { SessionsService } from './sessions.service.js'

@Controller('sessions')
export class SessionsController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly sessions: SessionsService,
  ) {}

  @Get()
  @Requires('signed-in')
  list(@WhoCalls() { actor, sessionId }: Caller): Promise<SessionListItem[]> {
    return this.unitOfWork.runForAccounts((tx) => this.sessions.list(tx, actor.personId, sessionId))
  }

  @Delete(':id')
  @HttpCode(204)
  @Requires('signed-in')
  end(@WhoCalls() { actor }: Caller, @Param('id', idParam) id: string): Promise<void> {
    return this.unitOfWork.runForAccounts((tx) => this.sessions.end(tx, actor.personId, id))
  }
}
