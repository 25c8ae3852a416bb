import { Injectable, type ExecutionContext } from '@nestjs/common'
import { Reflector } from '@nestjs/core'
import { AuthGuard } from '@nestjs/passport'
import type { Request, Response } from 'express'
import { Problem, reachOf } from 'shared'
import { Clock } from '../clock/clock.js'
import type { Caller } from './caller.js'
import { publicKey } from './public.decorator.js'
import { requiresKey, type Requirement } from './requires.decorator.js'
import { SessionCookies } from './session-cookies.service.js'
import { renewAfterSeconds } from './session-token.js'

type SignedIn = Caller & { tokenIssuedAt: number }

/** Stands before every route. A route that says nothing of who may call it is called by nobody. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(
    private readonly reflector: Reflector,
    private readonly cookies: SessionCookies,
    private readonly clock: Clock,
  ) {
    super()
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    if (this.reflector.get<boolean>(publicKey, context.getHandler()) === true) return true
    const requirement = this.reflector.get<Requirement | undefined>(requiresKey, context.getHandler())
    if (requirement === undefined) throw new Problem('forbidden')
    await super.canActivate(context)
    const http = context.switchToHttp()
    const caller = http.getRequest<Request & { user: SignedIn }>().user
    await this.renew(http.getResponse<Response>(), caller)
    if (requirement !== 'signed-in' && reachOf(caller.actor, requirement) === null)
      throw new Problem('forbidden')
    return true
  }

  override handleRequest<Person>(error: unknown, person: Person | false): Person {
    if (error instanceof Error) throw error
    if (person === false || person === undefined) throw new Problem('not-signed-in')
    return person
  }

  private async renew(response: Response, { actor, sessionId, tokenIssuedAt }: SignedIn): Promise<void> {
    const ageSeconds = this.clock.now().getTime() / 1000 - tokenIssuedAt
    if (ageSeconds >= renewAfterSeconds) {
      await this.cookies.give(response, { personId: actor.personId, sessionId })
    }
  }
}
