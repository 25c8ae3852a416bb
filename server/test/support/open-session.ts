import { JwtService } from '@nestjs/jwt'
import { SessionsService } from '../../src/accounts/sessions.service'
import { sessionCookieName, tokenAudience } from '../../src/platform/auth/session-token'
import { UnitOfWork } from '../../src/platform/database/unit-of-work'
import type { ApiClient } from './api-client'
import type { TestApp } from './test-app'

export interface OpenedSession {
  api: ApiClient
  sessionId: string
}

interface Where {
  personId: string
  districtId: string
}

interface TokenToForge {
  personId: string
  sessionId: string
  secret?: string
  issuedAt?: Date
  expiresAt?: Date
}

const seconds = (at: Date): number => Math.floor(at.getTime() / 1000)

/** A cookie as the server would write it, or as it never would. */
export function forgeCookie(app: TestApp, given: TokenToForge): string {
  const { personId, sessionId, issuedAt = new Date() } = given
  const expiresAt = given.expiresAt ?? new Date(issuedAt.getTime() + 15 * 60_000)
  const claims = { sid: sessionId, sub: personId, aud: tokenAudience }
  const token = new JwtService({ secret: given.secret ?? app.config.secrets.jwtSecret }).sign({
    ...claims,
    iat: seconds(issuedAt),
    exp: seconds(expiresAt),
  })
  return `${sessionCookieName}=${token}`
}

/** Signed in without a password, whose hashing takes long on purpose. */
export async function openSession(app: TestApp, { personId, districtId }: Where): Promise<OpenedSession> {
  const session = await app.nest
    .get(UnitOfWork)
    .runForAccounts((tx) =>
      app.nest
        .get(SessionsService, { strict: false })
        .begin(tx, { personId, districtId, userAgent: 'a test' }),
    )
  const api = app.client()
  api.cookie = forgeCookie(app, { personId, sessionId: session.id })
  return { api, sessionId: session.id }
}
