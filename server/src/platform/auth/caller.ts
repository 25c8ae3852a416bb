import type { Actor } from 'shared'

/** Who sends a request, from where, and with which roles today. */
export interface Caller {
  actor: Actor
  sessionId: string
  /** Set when the caller came by a mailed link: the one job it opens. */
  onlyJobId: string | null
  remoteAddress: string
  userAgent: string
}

export type KnownCaller = Pick<Caller, 'actor' | 'onlyJobId' | 'sessionId'>

/** Looks up on every request whether a session still stands and what its person may do. */
export abstract class CallerLookup {
  /** Null when the session was ended or ran out, or the person may no longer come in. */
  abstract find(sessionId: string): Promise<KnownCaller | null>
}
