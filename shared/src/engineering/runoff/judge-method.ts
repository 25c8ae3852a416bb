import type { DesignPeakInput, Refused } from './design-peak-types.js'
import { limitsCrossed } from './limits-crossed.js'
import { methodLimits, type LimitedField, type LimitedMethod } from './method-limits.js'

interface JudgeInput {
  method: LimitedMethod
  values: Partial<Record<LimitedField, number>>
  input: Pick<DesignPeakInput, 'districtLimits'>
}

interface Judged {
  refusal: Refused | undefined
  notes: string[]
}

/**
 * Whether a method may be used on a site, by the published limits and the district's own beside them.
 *
 * @returns `refusal` with the first limit that refuses; `notes` for limits that are only from memory.
 * @example judgeMethod({ method: 'graphical', values: { curveNumber: 35 }, input: {} }).refusal // { refused: 'curveNumber is 35; …' }
 */
export function judgeMethod({ method, values, input }: JudgeInput): Judged {
  const limits = [...methodLimits, ...(input.districtLimits ?? [])]
  const crossed = limitsCrossed({ method, values, limits })
  const hard = crossed.find(({ fromMemory }) => !fromMemory)
  return {
    refusal: hard && { refused: hard.sentence },
    notes: crossed.filter(({ fromMemory }) => fromMemory).map(({ sentence }) => sentence),
  }
}
