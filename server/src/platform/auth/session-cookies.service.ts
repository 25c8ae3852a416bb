import { Injectable } from '@nestjs/common'
import { JwtService } from '@nestjs/jwt'
import type { CookieOptions, Response } from 'express'
import { sessionCookieName, tokenSeconds } from './session-token.js'

const options: CookieOptions = { secure: true, httpOnly: true, sameSite: 'lax', path: '/' }

/** The only place that writes the session's cookie. */
@Injectable()
export class SessionCookies {
  constructor(private readonly jwt: JwtService) {}

  async give(
    response: Response,
    { personId, sessionId }: { personId: string; sessionId: string },
  ): Promise<void> {
    const token = await this.jwt.signAsync({ sid: sessionId }, { subject: personId })
    response.cookie(sessionCookieName, token, { ...options, maxAge: tokenSeconds * 1000 })
  }

  take(response: Response): void {
    response.clearCookie(sessionCookieName, options)
  }
}
