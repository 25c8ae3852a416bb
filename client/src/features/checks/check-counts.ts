import type { CheckResult, Verdict } from 'shared'

/** What needs a person first stands first. */
export const verdictOrder: readonly Verdict[] = ['fail', 'caution', 'pass', 'not-applicable']

export const inOrder = (checks: readonly CheckResult[]): CheckResult[] =>
  verdictOrder.flatMap((verdict) => checks.filter((check) => check.verdict === verdict))

export const countOf = (checks: readonly CheckResult[], verdict: Verdict): number =>
  checks.filter((check) => check.verdict === verdict).length

const countWords: { readonly [verdict in Verdict]: readonly [one: string, many: string] } = {
  fail: ['fails', 'fail'],
  caution: ['caution', 'cautions'],
  pass: ['holds', 'hold'],
  'not-applicable': ['does not apply', 'do not apply'],
}

/** "1 fails", "14 hold". */
export const countText = (verdict: Verdict, count: number): string =>
  `${count} ${countWords[verdict][count === 1 ? 0 : 1]}`
