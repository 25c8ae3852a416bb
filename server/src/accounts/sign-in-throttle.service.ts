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

  /**
   * Counts a try as failed before the password is looked at, so that tries at the same time cannot share a free one.
   *
   * @throws Problem too-many-tries with the seconds to wait; such a try is not counted.
   */
  async begin(tx: AccountsTx, attempt: Attempt): Promise<void> {
    const keys = this.keysOf(attempt)
    const rows = await this.hold(tx, Object.values(keys))
    const until = Math.max(0, ...rows.map(({ blockedUntil }) => blockedUntil?.getTime() ?? 0))
    const retryAfterSeconds = Math.ceil((until - tx.at.getTime()) / 1000)
    if (retryAfterSeconds > 0) {
      const detail = `Wait ${retryAfterSeconds} seconds, then try again.`
      throw new Problem('too-many-tries', { retryAfterSeconds, detail })
    }
    for (const kind of ['pair', 'ip'] as const) {
      const row = rows.find(({ key }) => key === keys[kind])
      await tx.manager.update(SignInAttempt, { key: keys[kind] }, nextFailure(row, kind, tx.at))
    }
  }

  /** The try was no guess after all. */
  async succeed(tx: AccountsTx, attempt: Attempt): Promise<void> {
    const { pair, ip } = this.keysOf(attempt)
    const [row] = await this.hold(tx, [ip])
    const failures = Math.max(0, (row?.failures ?? 1) - 1)
    await tx.manager.update(SignInAttempt, { key: ip }, { failures, blockedUntil: null })
    await tx.manager.delete(SignInAttempt, { key: pair })
  }

  /** In one order always, so that two tries never wait for each other. */
  private async hold(tx: AccountsTx, keys: readonly string[]): Promise<SignInAttempt[]> {
    const sorted = [...keys].sort()
    for (const key of sorted) {
      await tx.manager.query(
        'insert into sign_in_attempts (key, failures, last_tried_at) values ($1, 0, $2) on conflict do nothing',
        [key, tx.at],
      )
    }
    return tx.manager.find(SignInAttempt, {
      where: { key: In(sorted) },
      order: { key: 'ASC' },
      lock: { mode: 'pessimistic_write' },
    })
  }

  private keysOf({ email, ip }: Attempt) {
    return { pair: this.keyed(`pair ${email} ${ip}`), ip: this.keyed(`ip ${ip}`) }
  }

  private keyed(text: string): string {
    return createHmac('sha256', this.config.secrets.jwtSecret).update(text).digest('base64url')
  }
}

function nextFailure(row: SignInAttempt | undefined, kind: keyof typeof freeFailures, at: Date) {
  const isForgotten = row === undefined || at.getTime() - row.lastTriedAt.getTime() > forgottenAfterMs
  const failures = isForgotten ? 1 : row.failures + 1
  const beyond = failures - freeFailures[kind]
  const waitMs = Math.min(2 ** Math.max(0, beyond), longestWaitS) * 1000
  const blockedUntil = beyond < 0 ? null : new Date(at.getTime() + waitMs)
  return { failures, lastTriedAt: at, blockedUntil }
}
