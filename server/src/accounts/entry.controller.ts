import { Body, Controller, HttpCode, Post, Req, Res } from '@nestjs/common'
import type { Request, Response } from 'express'
import { enterCodeSchema, openLinkSchema, type SessionView } from 'shared'
import type { z } from 'zod'
import { Public } from '../platform/auth/public.decorator.js'
import { SessionCookies } from '../platform/auth/session-cookies.service.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { EntryService } from './entry.service.js'
import { SessionViewService } from './session-view.service.js'

@Controller('entry')
export class EntryController {
  constructor(
    private readonly entry: EntryService,
    private readonly cookies: SessionCookies,
    private readonly views: SessionViewService,
  ) {}

  @Post('open')
  @HttpCode(202)
  @Public()
  open(
    @Body(parsedBy(openLinkSchema)) { token }: z.infer<typeof openLinkSchema>,
  ): Promise<{ emailHint: string }> {
    return this.entry.open(token)
  }

  @Post('code')
  @Public()
  async enter(
    @Body(parsedBy(enterCodeSchema)) body: z.infer<typeof enterCodeSchema>,
    @Req() request: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<SessionView> {
    const userAgent = request.get('user-agent') ?? ''
    const session = await this.entry.enter({ ...body, userAgent })
    await this.cookies.give(response, { personId: session.personId, sessionId: session.id })
    return this.views.read(session.id)
  }
}
