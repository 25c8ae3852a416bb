import { Injectable } from '@nestjs/common'
import { PassportStrategy } from '@nestjs/passport'
import type { Request } from 'express'
import { Strategy } from 'passport-jwt'
import { Config } from '../config/config.js'
import { CallerLookup, type Caller } from './caller.js'
import { sessionCookieName, tokenAlgorithm, tokenAudience, tokenSchema } from './session-token.js'

/** A token only says which session it is; whether that still stands is asked on every request. */
@Injectable()
export class JwtStrategy extends PassportStrategy(Strategy) {
  constructor(
    config: Config,
    private readonly callers: CallerLookup,
  ) {
    super({
      jwtFromRequest: (request: Request) => request.cookies[sessionCookieName] ?? null,
      secretOrKey: config.secrets.jwtSecret,
      algorithms: [tokenAlgorithm],
      audience: tokenAudience,
      passReqToCallback: true,
    })
  }

  async validate(request: Request, payload: unknown): Promise<(Caller & { tokenIssuedAt: number }) | false> {
    const token = tokenSchema.safeParse(payload)
    if (!token.success) return false
    const { sub, sid, iat } = token.data
    const known = await this.callers.find(sid)
    if (known === null || known.actor.personId !== sub) return false
    return {
      ...known,
      tokenIssuedAt: iat,
      remoteAddress: request.ip ?? '',
      userAgent: (request.get('user-agent') ?? '').slice(0, 300),
    }
  }
}
