import { edges, type Edge, type JobAction } from './edges.js'
import { guards } from './guards.js'
import type { ActRequest, JobFacts } from './job-facts.js'
import type { Actor } from './roles.js'
import { stateWords, type JobState } from './states.js'
import { actionWords } from './action-words.js'

export type Decision =
  | { readonly allowed: true; readonly to: JobState }
  | {
      readonly allowed: false
      readonly problem: 'transition-not-allowed' | 'forbidden'
      readonly reasons: readonly string[]
    }

const edgeFor = (state: JobState, action: JobAction): Edge | undefined =>
  edges.find((edge) => edge.action === action && edge.from.includes(state))

/**
 * Decides one act on one job. Pure: it looks at nothing but its arguments.
 *
 * @param facts what the server knows of the job, read under lock
 * @param action the act asked for
 * @param actor who asks, with the roles held in the job's district
 * @param request what comes with the act; null while only asking which acts are open
 * @returns the state the job moves to, or the sentences that say what blocks it
 */
export function decide(
  facts: JobFacts,
  action: JobAction,
  actor: Actor,
  request: ActRequest | null,
): Decision {
  const edge = edgeFor(facts.state, action)
  if (edge === undefined) {
    const sentence = `A job that is ${stateWords[facts.state]} cannot do this: ${actionWords[action]}.`
    return { allowed: false, problem: 'transition-not-allowed', reasons: [sentence] }
  }
  if (actor.districtId !== facts.districtId || !edge.roles.some((role) => actor.roles.includes(role))) {
    const sentence = `Only a ${edge.roles.join(' or a ')} may do this: ${actionWords[action]}.`
    return { allowed: false, problem: 'forbidden', reasons: [sentence] }
  }
  const reasons = edge.guards
    .map((name) => guards[name](facts, actor, request))
    .filter((reason) => reason !== null)
  if (reasons.length > 0) return { allowed: false, problem: 'transition-not-allowed', reasons }
  return { allowed: true, to: edge.toWhile?.holds(facts, actor.personId) ? edge.toWhile.to : edge.to }
}
