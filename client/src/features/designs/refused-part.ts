import type { DesignPart } from 'shared'
import { ProblemError } from '../../api/problem-error'
import { designPlanParts } from './part-catalogue'

/** The part on which the first field that the server refused stands. */
export function refusedPart(error: unknown): DesignPart | null {
  if (!(error instanceof ProblemError)) return null
  const named = error.fields.map(({ pointer }) => /^\/plan\/([^/]+)/.exec(pointer)?.[1])
  return designPlanParts.find((part) => named[0] === part) ?? null
}
