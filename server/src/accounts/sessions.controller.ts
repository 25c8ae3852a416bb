import { Controller, Delete, Get, HttpCode, Param } from '@nestjs/common'
import { Problem, type SessionListItem } from 'shared'
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
  async list(@WhoCalls() { actor, sessionId, onlyJobId }: Caller): Promise<SessionListItem[]> {
    const all = await this.unitOfWork.runForAccounts((tx) =>
      this.sessions.list(tx, actor.personId, sessionId),
    )
    // A mailed link opens one job, and nothing of what the same person does elsewhere.
    return onlyJobId === null ? all : all.filter(({ isThis }) => isThis)
  }

  @Delete(':id')
  @HttpCode(204)
  @Requires('signed-in')
  async end(
    @WhoCalls() { actor, sessionId, onlyJobId }: Caller,
    @Param('id', idParam) id: string,
  ): Promise<void> {
    if (onlyJobId !== null && id !== sessionId) throw new Problem('not-found')
    return this.unitOfWork.runForAccounts((tx) => this.sessions.end(tx, actor.personId, id))
  }
}
