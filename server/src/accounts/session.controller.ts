import { Body, Controller, Delete, Get, HttpCode, Post, Put, Req, Res } from '@nestjs/common'
import type { Request, Response } from 'express'
import { chooseDistrictSchema, signInSchema, type SessionView } from 'shared'
import type { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Public } from '../platform/auth/public.decorator.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { SessionCookies } from '../platform/auth/session-cookies.service.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { UnitOfWork } from '../platform/database/unit-of-work.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { SessionViewService } from './session-view.service.js'
import { SessionsService } from './sessions.service.js'
import { SignInService } from './sign-in.service.js'

@Controller('session')
export class SessionController {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly cookies: SessionCookies,
    private readonly signIns: SignInService,
    private readonly sessions: SessionsService,
    private readonly views: SessionViewService,
  ) {}

  @Post()
  @Public()
  async signIn(
    @Body(parsedBy(signInSchema)) body: z.infer<typeof signInSchema>,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionView> {
    const session = await this.signIns.signIn({
      ...body,
      ip: request.ip ?? '',
      userAgent: request.get('user-agent') ?? '',
    })
    await this.cookies.give(response, { personId: session.personId, sessionId: session.id })
    return this.views.read(session.id)
  }

  @Get()
  @Requires('signed-in')
  read(@WhoCalls() { sessionId }: Caller): Promise<SessionView> {
    return this.views.read(sessionId)
  }

  @Delete()
  @HttpCode(204)
  @Requires('signed-in')
  async signOut(
    @WhoCalls() { actor, sessionId }: Caller,
    @Res({ passthrough: true }) response: Response,
  ): Promise<void> {
    await this.unitOfWork.runForAccounts((tx) => this.sessions.end(tx, actor.personId, sessionId))
    this.cookies.take(response)
  }

  @Put('district')
  @Requires('signed-in')
  async chooseDistrict(
    @WhoCalls() { actor, sessionId }: Caller,
    @Body(parsedBy(chooseDistrictSchema)) { districtId }: z.infer<typeof chooseDistrictSchema>,
  ): Promise<SessionView> {
    await this.unitOfWork.runForAccounts((tx) =>
      this.sessions.moveTo(tx, { id: sessionId, personId: actor.personId, districtId }),
    )
    return this.views.read(sessionId)
  }
}
