import { createHmac } from 'node:crypto'
import { Injectable } from '@nestjs/common'
import { Problem } from 'shared'
import { In } from 'typeorm'
import { Config } from '../platform/config/config.js'
import type { AccountsTx } from '../platform/database/tx.js'
import { SignInAttempt } from './sign-in-attempt.entity.js'

export interface Attempt {
  email: string
  ip: string
}

/** Failures that cost nothing, and the longest wait. The wait doubles with each failure beyond. */
const freeFailures = { pair: 5, ip: 40 } as const
const longestWaitS = 300
const forgottenAfterMs = 60 * 60 * 1000

/**
 * Slows guessing down. An account is slowed only from the address that guesses, so that nobody can lock its owner
 * out from elsewhere.
 */
@Injectable()
export class SignInThrottle {
  constructor(private readonly config: Config) {}

  /** @throws Problem too-many-tries with the seconds to wait. */
  async refuseWhileBlocked(tx: AccountsTx, attempt: Attempt): Promise<void> {
    const keys = Object.values(this.keysOf(attempt))
    const rows = await tx.manager.findBy(SignInAttempt, { key: In(keys) })
    const until = Math.max(0, ...rows.map(({ blockedUntil }) => blockedUntil?.getTime() ?? 0))
    const retryAfterSeconds = Math.ceil((until - tx.at.getTime()) / 1000)
    if (retryAfterSeconds <= 0) return
    throw new Problem('too-many-tries', {
      retryAfterSeconds,
      detail: `Wait ${retryAfterSeconds} seconds, then try again.`,
    })
  }

  async noteFailure(tx: AccountsTx, attempt: Attempt): Promise<void> {
    const keys = this.keysOf(attempt)
    for (const kind of ['pair', 'ip'] as const) {
      const [{ failures }] = await tx.manager.query(
        `insert into sign_in_attempts as a (key, failures, last_tried_at) values ($1, 1, $2)
         on conflict (key) do update set last_tried_at = $2,
           failures = case when a.last_tried_at < $3 then 1 else a.failures + 1 end
         returning failures`,
        [keys[kind], tx.at, new Date(tx.at.getTime() - forgottenAfterMs)],
      )
      const beyond = failures - freeFailures[kind]
      if (beyond < 0) continue
      const waitMs = Math.min(2 ** beyond, longestWaitS) * 1000
      await tx.manager.update(
        SignInAttempt,
        { key: keys[kind] },
        { blockedUntil: new Date(tx.at.getTime() + waitMs) },
      )
    }
  }

  async forget(tx: AccountsTx, attempt: Attempt): Promise<void> {
    await tx.manager.delete(SignInAttempt, { key: this.keysOf(attempt).pair })
  }

  private keysOf({ email, ip }: Attempt) {
    return { pair: this.keyed(`pair ${email} ${ip}`), ip: this.keyed(`ip ${ip}`) }
  }

  private keyed(text: string): string {
    return createHmac('sha256', this.config.secrets.jwtSecret).update(text).digest('base64url')
  }
}
