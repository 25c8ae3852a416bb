import { noBreakSpace } from './no-break-space.js'
import { trimmedNumber } from './trimmed-number.js'

/** A percent with at most one decimal: formatPercent(12.5) is "12.5 %". */
export const formatPercent = (percent: number, mostPlaces = 1): string =>
  `${trimmedNumber(percent, mostPlaces)}${noBreakSpace}%`
