import { Body, Controller, HttpCode, Post } from '@nestjs/common'
import { changePasswordSchema } from 'shared'
import type { z } from 'zod'
import type { Caller } from '../platform/auth/caller.js'
import { Requires } from '../platform/auth/requires.decorator.js'
import { WhoCalls } from '../platform/auth/who-calls.decorator.js'
import { parsedBy } from '../platform/web/parsed-by.js'
import { PasswordService } from './password.service.js'

@Controller('account')
export class AccountController {
  constructor(private readonly passwords: PasswordService) {}

  @Post('password')
  @HttpCode(204)
  @Requires('signed-in')
  changePassword(
    @WhoCalls() { actor, sessionId }: Caller,
    @Body(parsedBy(changePasswordSchema)) body: z.infer<typeof changePasswordSchema>,
  ): Promise<void> {
    return this.passwords.change({ ...body, personId: actor.personId, sessionId })
  }
}
