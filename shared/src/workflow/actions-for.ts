import { decide } from './decide.js'
import { edges, type JobAction } from './edges.js'
import type { JobFacts } from './job-facts.js'
import type { Actor } from './roles.js'
import { actionWords } from './action-words.js'

export interface OfferedAction {
  readonly action: JobAction
  readonly words: string
  readonly enabled: boolean
  /** What still blocks it, in whole sentences. */
  readonly reasons: readonly string[]
}

/** The buttons of a job for one person: each act of the present state that the person's roles allow. */
export function actionsFor(facts: JobFacts, actor: Actor): OfferedAction[] {
  return edges
    .filter((edge) => edge.from.includes(facts.state))
    .map((edge) => ({ edge, decision: decide(facts, edge.action, actor, null) }))
    .filter(({ decision }) => decision.allowed || decision.problem !== 'forbidden')
    .map(({ edge, decision }) => ({
      action: edge.action,
      words: actionWords[edge.action],
      enabled: decision.allowed,
      reasons: decision.allowed ? [] : decision.reasons,
    }))
}
