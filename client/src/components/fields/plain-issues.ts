import type { z } from 'zod'

export interface PlainIssue {
  path: PropertyKey[]
  message: string
}

type Issue = z.core.$ZodIssue
type RawIssue = z.core.$ZodRawIssue

const expectedSentences: Record<string, string> = {
  number: 'Give a number',
  int: 'Give a whole number',
  string: 'This must not be empty',
  boolean: 'Say yes or no',
  array: 'Add at least one',
}

function counted(origin: string, count: number | bigint, bound: string): string {
  if (origin === 'array') return `Give ${bound} ${count} of them`
  return origin === 'string' ? `Give ${bound} ${count} characters` : `Must be ${bound} ${count}`
}

/** What a schema without a sentence of its own says; undefined where there is nothing plainer to say. */
export function plainSentence(issue: RawIssue): string | undefined {
  if (issue.code === 'invalid_type') return expectedSentences[issue.expected] ?? 'This is missing'
  if (issue.code === 'invalid_value') return 'Choose one'
  if (issue.code === 'too_small') return counted(issue.origin, issue.minimum, 'at least')
  if (issue.code === 'too_big') return counted(issue.origin, issue.maximum, 'at most')
  return undefined
}

/** What the schema library says by itself is written for programmers. Sentences of our own schemas are kept. */
function sentenceOf(issue: Issue, isChoice: boolean): string {
  if (issue.code === 'unrecognized_keys' && isChoice) return 'Give one of the two, not both'
  if (!/^(Invalid|Too|Unrecognized)/.test(issue.message)) return issue.message
  return plainSentence(issue as RawIssue) ?? issue.message
}

/** Of several shapes the one that was meant: nothing in it that it does not know, and the least amiss. */
const meantShape = (shapes: readonly Issue[][]): Issue[] | undefined =>
  [...shapes].sort((one, other) => strangeness(one) - strangeness(other))[0]

const strangeness = (issues: readonly Issue[]): number =>
  issues.length + issues.filter(({ code }) => code === 'unrecognized_keys').length * 100

/** Every issue at the field it belongs to: of a choice between shapes, what the shape that was meant still lacks. */
export function plainIssues(
  issues: readonly Issue[],
  under: readonly PropertyKey[] = [],
  isChoice = false,
): PlainIssue[] {
  return issues.flatMap((issue) => {
    const path = [...under, ...issue.path]
    const shape = issue.code === 'invalid_union' ? meantShape(issue.errors) : undefined
    return shape ? plainIssues(shape, path, true) : [{ path, message: sentenceOf(issue, isChoice) }]
  })
}
