import { publishedCriteria, type CriteriaSetInput } from 'shared'

/** What a district begins with, before it has a set of its own. The editions are those current on the day given. */
export const publishedCriteriaInput = (effectiveFrom = '2026-01-01'): CriteriaSetInput => ({
  name: 'Published criteria',
  effectiveFrom,
  criteria: publishedCriteria,
})
