import { formatRatio, noBreakSpace, trimmedNumber, unitText, type CheckResult } from 'shared'

const comparisonWords = { 'at-least': 'at least ', 'at-most': 'at most ', between: '', yes: '' } as const

const isRatio = (unit: string): boolean => unit === 'run per rise'

const plain = (value: number, unit: string): string =>
  isRatio(unit) ? formatRatio(value) : trimmedNumber(value, 3)

const withUnit = (text: string, unit: string, value: number): string =>
  unit === '' || isRatio(unit) ? text : `${text}${noBreakSpace}${unitText(unit, value)}`

/** What the design has. */
export function hasText({ actual, unit }: CheckResult): string {
  if (actual === null) return 'not worked out'
  if (typeof actual === 'boolean') return actual ? 'met' : 'not met'
  return `has ${withUnit(plain(actual, unit), unit, actual)}`
}

/** What it must have; null where "met" says it all. */
export function needsText({ comparison, limit, unit }: CheckResult): string | null {
  if (comparison === 'yes') return null
  if (limit === null) return 'no limit set'
  const ends = typeof limit === 'number' ? [limit] : limit
  const text = ends.map((end) => plain(end, unit)).join(' to ')
  return `needs ${comparisonWords[comparison]}${withUnit(text, unit, ends.at(-1) ?? 0)}`
}
