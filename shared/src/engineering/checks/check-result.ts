import type { Criterion } from '../../schemas/criteria.js'

export type Verdict = 'pass' | 'caution' | 'fail' | 'not-applicable'

export interface CheckResult {
  id: string
  practice: string
  title: string
  comparison: Criterion['comparison']
  /** What the design has; null when it could not be worked out or does not apply. */
  actual: number | boolean | null
  /** What it must have; null when no limit is set. */
  limit: number | readonly [number, number] | null
  unit: string
  verdict: Verdict
  source: string
  note: string
}
