import { EngineeringInputError } from '../engineering-input-error.js'
import { requireNumber } from '../require-number.js'
import type { FenceRun } from './fence-input.js'

const KINDS: readonly string[] = ['electric', 'barbed', 'woven', 'smooth']
const ROLES: readonly string[] = ['exclusion', 'lane', 'closing', 'other']
const MOST_WIRES = 30

/**
 * Refuses a run that no take-off can be made of; an energized run in the water is refused outright.
 *
 * @param at where the run stands in the input, such as runs[0].
 * @throws EngineeringInputError naming the field of the run.
 * The rule for water is a district safety rule, without a published authority.
 * @example checkFenceRun(run, 'runs[0]')
 */
export function checkFenceRun(run: FenceRun, at: string): void {
  if (!KINDS.includes(run.fence)) refuse(`${at}.fence`, `is not known; it must be ${KINDS.join(', ')}.`)
  if (!ROLES.includes(run.role)) refuse(`${at}.role`, `is not known; it must be ${ROLES.join(', ')}.`)
  if (run.inWater && run.energized) {
    refuse(
      `${at}.energized`,
      'is true on a run in the water; no run in the water is energized (district safety rule, no published authority). Enter a hot wire above a float as a separate run out of the water, with a note.',
    )
  }
  const leastWires = run.fence === 'woven' ? 0 : 1
  const wires = { value: run.wires, min: leastWires, max: MOST_WIRES, integer: true }
  requireNumber({ field: `${at}.wires`, ...wires })
  const mostHot = run.energized ? run.wires : 0
  const hot = { value: run.hotWires ?? 0, min: 0, max: mostHot, integer: true }
  requireNumber({ field: `${at}.hotWires`, ...hot })
  requireNumber({ field: `${at}.postSpacingFt`, value: run.postSpacingFt, exclusiveMin: 0 })
}

function refuse(field: string, problem: string): never {
  throw new EngineeringInputError({ field, message: `${field} ${problem}` })
}
