import type { Act, Actor, JobFacts, JobState } from 'shared'
import type { Tx } from '../../platform/database/tx.js'
import type { EventFacts } from '../../platform/events/event-facts.js'
import type { Job } from '../job.entity.js'

export type ActName = Act['action']
export type ActOf<Name extends ActName> = Extract<Act, { action: Name }>

/** From where a person acts, as the server saw it. */
export interface ActOrigin {
  sessionId: string
  /** By the link and code that were mailed, and not by a password. */
  cameByLink: boolean
  remoteAddress: string
  userAgent: string
}

/** Everything around one decided act. */
export interface ActScene {
  actor: Actor
  origin: ActOrigin
  job: Job
  /** As they were when the act was decided. */
  facts: JobFacts
  to: JobState
  /** Of packet A; null while there is none. */
  revision: number | null
}

/** One decided act, on its way to be recorded. */
export interface ActContext<Name extends ActName = ActName> extends ActScene {
  act: ActOf<Name>
}

/** What an act leaves behind beside its rows. */
export interface ActEffect {
  /** For the event. Ids, hashes and numbers, never what a person wrote. */
  facts?: EventFacts
  /** Set by the approval alone. */
  finalPacketId?: string
}

export type Recorder<Name extends ActName> = (tx: Tx, context: ActContext<Name>) => Promise<ActEffect>
export type Recorders = { readonly [Name in ActName]: Recorder<Name> }
