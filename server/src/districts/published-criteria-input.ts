import { publishedCriteria, type CriteriaSetInput } from 'shared'

/** What a district begins with, before it has a set of its own. */
export const publishedCriteriaInput = (effectiveFrom: string): CriteriaSetInput => ({
  name: 'Published criteria',
  effectiveFrom,
  criteria: publishedCriteria,
})
