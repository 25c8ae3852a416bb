import type { ScheduleLine } from 'shared'
import type { Difference } from '../../components/feedback/stale-choice'
import { payWords } from './quantity-choices'

/** Lines that pay for one thing here and for another where somebody else saved. */
export const mappingDifferences = (
  mine: readonly ScheduleLine[],
  theirs: readonly ScheduleLine[],
): Difference[] =>
  theirs.flatMap(({ code, title, quantityKey }) => {
    const own = mine.find((line) => line.code === code)?.quantityKey ?? null
    return own === quantityKey
      ? []
      : [{ label: `${code}, ${title}`, mine: payWords(own), theirs: payWords(quantityKey) }]
  })
