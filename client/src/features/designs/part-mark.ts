import type { DesignPart, DesignResult } from 'shared'
import type { MarkKind } from '../../components/feedback/verdict-mark'
import type { PartSpec } from './part-spec'

export interface PartMark {
  kind: MarkKind
  words: string
}

interface PartMarkInput {
  spec: PartSpec
  result: DesignResult
  isBegun: boolean
  unfinished: readonly DesignPart[]
}

/** How a part stands: what is typed first, then what follows from it. */
export function partMark({ spec, result, isBegun, unfinished }: PartMarkInput): PartMark {
  if (!isBegun) return { kind: 'not-applicable', words: 'not begun' }
  if (unfinished.includes(spec.part)) return { kind: 'caution', words: 'not complete' }
  const parts = spec.results.map((key) => result[key])
  if (parts.some((part) => !part.ok && 'message' in part)) return { kind: 'fail', words: 'needs a look' }
  if (parts.some((part) => !part.ok)) return { kind: 'waiting', words: 'waiting' }
  return { kind: 'pass', words: 'worked out' }
}
