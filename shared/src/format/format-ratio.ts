import { noBreakSpace } from './no-break-space.js'
import { trimmedNumber } from './trimmed-number.js'

/** A slope as run to rise: formatRatio(6) is "6 : 1". */
export const formatRatio = (runPerRise: number, mostPlaces = 2): string =>
  [trimmedNumber(runPerRise, mostPlaces), ':', '1'].join(noBreakSpace)
